import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** What a checker saw of one wall when marking it as checked. */
@Entity({ name: 'wall_check' })
@Index(['buildingId'])
export class WallCheck {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @ForeignKey(() => Person, { onDelete: 'RESTRICT' })
  @Column({ type: 'varchar', length: 36 })
  byPersonId!: string;

  @Column({ type: 'varchar', length: 24 })
  at!: string;

  @Column({ type: 'integer' })
  seq!: number;

  @Column({ type: 'simple-json' })
  facts!: object;
}
