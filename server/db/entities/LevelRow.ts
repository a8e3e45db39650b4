import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** levels.csv, in the building's own units. */
@Entity({ name: 'level_row' })
@Index(['buildingId', 'position'])
export class LevelRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'double precision' })
  position!: number;

  @Column({ type: 'varchar', length: 500 })
  level!: string;

  @Column({ type: 'double precision' })
  height!: number;

  @Column({ type: 'double precision', nullable: true })
  elevation!: number | null;

  @Column({ type: 'double precision', nullable: true })
  x!: number | null;

  @Column({ type: 'double precision', nullable: true })
  y!: number | null;

  @Column({ type: 'double precision', nullable: true })
  extent_x!: number | null;

  @Column({ type: 'double precision', nullable: true })
  extent_y!: number | null;

  @Column({ type: 'double precision', nullable: true })
  edge_x!: number | null;

  @Column({ type: 'double precision', nullable: true })
  edge_y!: number | null;

  @Column({ type: 'varchar', length: 20, nullable: true })
  diaphragm!: string | null;

  @Column({ type: 'double precision', nullable: true })
  weight!: number | null;

  @Column({ type: 'double precision', nullable: true })
  gravity!: number | null;

  @Column({ type: 'integer' })
  version!: number;
}
