import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Person } from './Person.ts';
import { Revision } from './Revision.ts';

/** A cell of a revision that a drafter has drawn. */
@Entity({ name: 'drawn_tick' })
@Index(['revisionId'])
export class DrawnTick {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Revision, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  revisionId!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  personId!: string;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @Column({ type: 'varchar', length: 500 })
  level!: string;

  @Column({ type: 'varchar', length: 60 })
  cell!: string;
}
