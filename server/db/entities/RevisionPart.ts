import { Column, Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';

import { Revision } from './Revision.ts';

/** One part of a revision, gzip in base64 text. Triggers refuse every change in both engines. */
@Entity({ name: 'revision_part' })
@Unique(['revisionId', 'kind'])
export class RevisionPart {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Revision, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  revisionId!: string;

  @Column({ type: 'varchar', length: 20 })
  kind!: string;

  @Column({ type: 'varchar', length: 64 })
  hash!: string;

  @Column({ type: 'text' })
  body!: string;
}
