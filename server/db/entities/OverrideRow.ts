import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** overrides.csv: what an engineer hands to a wall with a reason. */
@Entity({ name: 'override_row' })
@Index(['buildingId', 'position'])
export class OverrideRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'double precision' })
  position!: number;

  @Column({ type: 'varchar', length: 20 })
  kind!: string;

  @Column({ type: 'varchar', length: 500 })
  level!: string;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @Column({ type: 'varchar', length: 500, nullable: true })
  case!: string | null;

  @Column({ type: 'double precision', nullable: true })
  shear!: number | null;

  @Column({ type: 'double precision', nullable: true })
  axial!: number | null;

  @Column({ type: 'double precision', nullable: true })
  moment!: number | null;

  @Column({ type: 'double precision', nullable: true })
  share!: number | null;

  @Column({ type: 'text' })
  reason!: string;

  @Column({ type: 'integer' })
  version!: number;
}
