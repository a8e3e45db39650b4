import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Person } from './Person.ts';
import { Remark } from './Remark.ts';

/** An answer to a remark. */
@Entity({ name: 'remark_reply' })
@Index(['remarkId'])
export class RemarkReply {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Remark, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  remarkId!: string;

  @Column({ type: 'text' })
  text!: string;

  @Column({ type: 'varchar', length: 20 })
  state!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  byId!: string;

  @Column({ type: 'varchar', length: 24 })
  at!: string;

  @Column({ type: 'integer' })
  version!: number;
}
