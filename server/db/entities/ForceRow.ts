import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** forces.csv, in the building's own units. */
@Entity({ name: 'force_row' })
@Index(['buildingId', 'position'])
export class ForceRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'double precision' })
  position!: number;

  @Column({ type: 'varchar', length: 500 })
  level!: string;

  @Column({ type: 'varchar', length: 500 })
  case!: string;

  @Column({ type: 'varchar', length: 20 })
  kind!: string;

  @Column({ type: 'double precision' })
  fx!: number;

  @Column({ type: 'double precision' })
  fy!: number;

  @Column({ type: 'double precision', nullable: true })
  x!: number | null;

  @Column({ type: 'double precision', nullable: true })
  y!: number | null;

  @Column({ type: 'double precision', nullable: true })
  mz!: number | null;

  @Column({ type: 'integer' })
  version!: number;
}
