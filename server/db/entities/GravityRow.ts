import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** gravity.csv, in the building's own units. */
@Entity({ name: 'gravity_row' })
@Index(['buildingId', 'position'])
export class GravityRow {
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
  wall!: string;

  @Column({ type: 'double precision' })
  dead!: number;

  @Column({ type: 'double precision', nullable: true })
  live!: number | null;

  @Column({ type: 'double precision', nullable: true })
  roof_live!: number | null;

  @Column({ type: 'double precision', nullable: true })
  snow!: number | null;

  @Column({ type: 'double precision', nullable: true })
  tributary_area!: number | null;

  @Column({ type: 'double precision', nullable: true })
  eccentricity!: number | null;

  @Column({ type: 'varchar', length: 20, nullable: true })
  live_class!: string | null;

  @Column({ type: 'integer' })
  version!: number;
}
