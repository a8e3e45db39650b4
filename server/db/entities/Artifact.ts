import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A file made by a job. */
@Entity({ name: 'artifact' })
export class Artifact {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 200 })
  name!: string;

  @Column({ type: 'varchar', length: 100 })
  type!: string;

  @Column({ type: 'integer' })
  size!: number;

  @Column({ type: 'varchar', length: 64 })
  hash!: string;

  @Column({ type: 'varchar', length: 24 })
  expiresAt!: string;
}
