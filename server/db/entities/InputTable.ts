import { Column, Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';

import { Building } from './Building.ts';

/** One input table of a building: its version serves If-Match, its source says where the rows came from. */
@Entity({ name: 'input_table' })
@Unique(['buildingId', 'table'])
export class InputTable {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'varchar', length: 20 })
  table!: string;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'varchar', length: 64, nullable: true })
  contentHash!: string | null;

  @Column({ type: 'simple-json', nullable: true })
  source!: object | null;
}
