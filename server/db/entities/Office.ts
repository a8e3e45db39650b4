import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One office: people and buildings belong to it. */
@Entity({ name: 'office' })
export class Office {
  @PrimaryColumn({ type: 'varchar', length: 36 })
  id!: string;

  @Column({ type: 'varchar', length: 200 })
  name!: string;

  @Column({ type: 'simple-json' })
  standards!: object;

  @Column({ type: 'integer' })
  version!: number;
}
