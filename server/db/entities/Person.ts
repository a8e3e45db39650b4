import { Column, Entity, ForeignKey, Index, PrimaryColumn, Unique } from 'typeorm';

import { Office } from './Office.ts';

/** Who may sign in. The address is stored in lower case. */
@Entity({ name: 'person' })
@Unique(['email'])
@Index(['officeId'])
export class Person {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Office, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  officeId!: string;

  @Column({ type: 'varchar', length: 254 })
  email!: string;

  @Column({ type: 'varchar', length: 200 })
  name!: string;

  @Column({ type: 'varchar', length: 20 })
  role!: string;

  @Column({ type: 'varchar', length: 200, nullable: true })
  passwordHash!: string | null;

  @Column({ type: 'boolean' })
  active!: boolean;

  @Column({ type: 'integer' })
  version!: number;
}
