import { Column, Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** An issued revision. Triggers refuse every change in both engines. */
@Entity({ name: 'revision' })
@Unique(['buildingId', 'n'])
export class Revision {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'integer' })
  n!: number;

  @Column({ type: 'varchar', length: 24 })
  at!: string;

  @Column({ type: 'text' })
  note!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  byId!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36, nullable: true })
  checkedById!: string | null;

  @Column({ type: 'varchar', length: 60 })
  engineVersion!: string;

  @Column({ type: 'varchar', length: 64 })
  inputsKey!: string;

  @Column({ type: 'varchar', length: 64 })
  contentHash!: string;

  @Column({ type: 'varchar', length: 36, nullable: true })
  previous!: string | null;
}
