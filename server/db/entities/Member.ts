import { Column, Entity, ForeignKey, Index, PrimaryColumn, Unique } from 'typeorm';

import { Building } from './Building.ts';
import { Person } from './Person.ts';

/** Who may open a building whose access is by membership. */
@Entity({ name: 'member' })
@Unique(['buildingId', 'personId'])
@Index(['personId'])
export class Member {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @ForeignKey(() => Person, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  personId!: string;
}
