import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** walls.csv, in the building's own units. */
@Entity({ name: 'wall_row' })
@Index(['buildingId', 'position'])
export class WallRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'double precision' })
  position!: number;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @Column({ type: 'double precision' })
  x1!: number;

  @Column({ type: 'double precision' })
  y1!: number;

  @Column({ type: 'double precision' })
  x2!: number;

  @Column({ type: 'double precision' })
  y2!: number;

  @Column({ type: 'double precision' })
  thickness!: number;

  @Column({ type: 'varchar', length: 500 })
  from_level!: string;

  @Column({ type: 'varchar', length: 500 })
  to_level!: string;

  @Column({ type: 'double precision', nullable: true })
  fc!: number | null;

  @Column({ type: 'double precision', nullable: true })
  share_x!: number | null;

  @Column({ type: 'double precision', nullable: true })
  share_y!: number | null;

  @Column({ type: 'double precision', nullable: true })
  opening!: number | null;

  @Column({ type: 'double precision', nullable: true })
  flexure_factor!: number | null;

  @Column({ type: 'double precision', nullable: true })
  shear_factor!: number | null;

  @Column({ type: 'integer' })
  version!: number;
}
