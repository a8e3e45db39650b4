import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** A warning that an engineer has settled with a reason; it lapses when `factsHash` moves. */
@Entity({ name: 'acknowledgment' })
@Index(['buildingId'])
export class Acknowledgment {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'varchar', length: 60 })
  code!: string;

  @Column({ type: 'varchar', length: 500, nullable: true })
  level!: string | null;

  @Column({ type: 'varchar', length: 500, nullable: true })
  wall!: string | null;

  @Column({ type: 'text' })
  reason!: string;

  @Column({ type: 'varchar', length: 64 })
  factsHash!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  byId!: string;

  @Column({ type: 'varchar', length: 24 })
  at!: string;
}
