import { Column, Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';

import { Artifact } from './Artifact.ts';

/** A chunk of an artifact, base64 text. */
@Entity({ name: 'artifact_part' })
@Unique(['artifactId', 'position'])
export class ArtifactPart {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Artifact, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  artifactId!: string;

  @Column({ type: 'integer' })
  position!: number;

  @Column({ type: 'text' })
  body!: string;
}
