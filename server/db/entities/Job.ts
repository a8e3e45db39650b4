import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Artifact } from './Artifact.ts';
import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** Long work, taken by a lease so that several processes share the table. */
@Entity({ name: 'job' })
@Index(['buildingId'])
@Index(['state'])
export class Job {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 30 })
  kind!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'simple-json' })
  params!: object;

  @Column({ type: 'varchar', length: 20 })
  state!: string;

  @Column({ type: 'double precision' })
  progress!: number;

  @Column({ type: 'boolean' })
  cancelAsked!: boolean;

  @Column({ type: 'integer' })
  attempts!: number;

  @Column({ type: 'varchar', length: 24, nullable: true })
  leaseUntil!: string | null;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  byId!: string;

  @ForeignKey(() => Artifact, { onDelete: 'SET NULL' })
  @Column({ type: 'varchar', length: 36, nullable: true })
  artifactId!: string | null;
}
