import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Office } from './Office.ts';

/** One building; `seq` rises by one in every transaction that changes it, `inputsSeq` with what results depend on. */
@Entity({ name: 'building' })
@Index(['officeId'])
export class Building {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Office, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  officeId!: string;

  @Column({ type: 'varchar', length: 200 })
  name!: string;

  @Column({ type: 'varchar', length: 100 })
  number!: string;

  @Column({ type: 'simple-json' })
  settings!: object;

  @Column({ type: 'integer' })
  seq!: number;

  @Column({ type: 'integer' })
  inputsSeq!: number;

  @Column({ type: 'varchar', length: 30 })
  state!: string;

  @Column({ type: 'varchar', length: 20 })
  access!: string;

  @Column({ type: 'varchar', length: 36, nullable: true })
  studyOf!: string | null;

  @Column({ type: 'varchar', length: 24 })
  createdAt!: string;

  @Column({ type: 'varchar', length: 24, nullable: true })
  deletedAt!: string | null;

  @Column({ type: 'integer' })
  version!: number;
}
