import { Column, Entity, ForeignKey, Index, PrimaryColumn, Unique } from 'typeorm';

import { Person } from './Person.ts';

/** An invitation or a password reset, by hash. */
@Entity({ name: 'token' })
@Unique(['hash'])
@Index(['personId'])
export class Token {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 20 })
  kind!: string;

  @Column({ type: 'varchar', length: 64 })
  hash!: string;

  @ForeignKey(() => Person, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  personId!: string;

  @Column({ type: 'varchar', length: 24 })
  expiresAt!: string;

  @Column({ type: 'varchar', length: 24, nullable: true })
  usedAt!: string | null;
}
