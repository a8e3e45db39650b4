import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** The outbox: written in the transaction that causes the mail, sent after it. */
@Entity({ name: 'mail' })
@Index(['state'])
export class Mail {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 254 })
  to!: string;

  @Column({ type: 'text' })
  subject!: string;

  @Column({ type: 'text' })
  text!: string;

  @Column({ type: 'text' })
  html!: string;

  @Column({ type: 'varchar', length: 20 })
  state!: string;

  @Column({ type: 'integer' })
  attempts!: number;

  @Column({ type: 'varchar', length: 24 })
  at!: string;
}
