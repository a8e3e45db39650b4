import { Column, Entity, ForeignKey, Index, PrimaryColumn, Unique } from 'typeorm';

import { Person } from './Person.ts';

/** A sign-in; only the hash of its random id is kept, so that a copy of the table opens nothing. */
@Entity({ name: 'session' })
@Unique(['hash'])
@Index(['personId'])
export class Session {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 64 })
  hash!: string;

  @ForeignKey(() => Person, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  personId!: string;

  @Column({ type: 'varchar', length: 24 })
  createdAt!: string;

  @Column({ type: 'varchar', length: 24 })
  seenAt!: string;

  @Column({ type: 'varchar', length: 24 })
  expiresAt!: string;

  @Column({ type: 'varchar', length: 24, nullable: true })
  revokedAt!: string | null;
}
