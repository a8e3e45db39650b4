import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

import { Building } from './Building.ts';

/** One band of one wall: what automatic choice says, what the engineer put over it, and the verdict last published. */
@Entity({ name: 'schedule_row' })
@Index(['buildingId', 'position'])
export class ScheduleRow {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @ForeignKey(() => Building, { onDelete: 'CASCADE' })
  @Column({ type: 'varchar', length: 36 })
  buildingId!: string;

  @Column({ type: 'varchar', length: 500 })
  wall!: string;

  @Column({ type: 'varchar', length: 500 })
  fromLevel!: string;

  @Column({ type: 'varchar', length: 500 })
  toLevel!: string;

  @Column({ type: 'integer' })
  position!: number;

  @Column({ type: 'simple-json' })
  stories!: string[];

  @Column({ type: 'simple-json' })
  auto!: object;

  @Column({ type: 'simple-json' })
  own!: object;

  @Column({ type: 'simple-json' })
  locks!: string[];

  @Column({ type: 'boolean' })
  bandPinned!: boolean;

  @Column({ type: 'text', nullable: true })
  reason!: string | null;

  @Column({ type: 'double precision', nullable: true })
  ratio!: number | null;

  @Column({ type: 'boolean' })
  ok!: boolean;

  @Column({ type: 'simple-json', nullable: true })
  governing!: object | null;

  @Column({ type: 'varchar', length: 64 })
  computedKey!: string;

  @Column({ type: 'integer' })
  version!: number;
}
