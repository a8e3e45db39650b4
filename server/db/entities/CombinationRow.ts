import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** combinations.csv. */
@Entity({ name: 'combination_row' })
@Index(['buildingId', 'position'])
export class CombinationRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'double precision' })
  position!: number;

  @Column({ type: 'varchar', length: 500, nullable: true })
  name!: string | null;

  @Column({ type: 'varchar', length: 500 })
  expression!: string;

  @Column({ type: 'integer' })
  version!: number;
}
