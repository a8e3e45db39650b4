import { Column, Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** The change log: one row an edit, with the changed cells before and after; the source of undo. */
@Entity({ name: 'change' })
@Unique(['buildingId', 'seq'])
export class Change {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'integer' })
  seq!: number;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  personId!: string;

  @Column({ type: 'varchar', length: 24 })
  at!: string;

  @Column({ type: 'varchar', length: 30 })
  kind!: string;

  @Column({ type: 'varchar', length: 200 })
  target!: string;

  @Column({ type: 'simple-json' })
  before!: object;

  @Column({ type: 'simple-json' })
  after!: object;

  @Column({ type: 'integer', nullable: true })
  undoes!: number | null;
}
