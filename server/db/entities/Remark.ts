import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** A checker's remark on a wall. */
@Entity({ name: 'remark' })
@Index(['buildingId'])
export class Remark {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @Column({ type: 'varchar', length: 500, nullable: true })
  level!: string | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  check!: string | null;

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
