import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { FixtureInput } from '../../shared/schemas/fixture.ts';
import { jsonText } from '../database/jsonText.ts';

/** What theory needs of a fixture, kept as one document. */
export type FixtureSpec = Pick<FixtureInput, 'axis' | 'move' | 'drive' | 'seat' | 'hold'>;

@Entity('fixture')
export class FixtureRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ type: 'varchar', length: 24, unique: true })
  code!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  @Column({ type: 'varchar', length: 60 })
  line!: string;

  @Column({ type: 'varchar', length: 20 })
  status!: FixtureInput['status'];

  @Column({ type: 'text', nullable: true })
  remark!: string | null;

  @Column({ type: 'longtext', transformer: jsonText })
  spec!: FixtureSpec;

  @Column({ type: 'int', unsigned: true })
  version!: number;

  /** Raised by every change an analysis depends on; the cached verdict is keyed by it. */
  @Column({ name: 'data_version', type: 'int', unsigned: true })
  dataVersion!: number;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;

  @Column({ name: 'updated_at', type: 'datetime', precision: 6 })
  updatedAt!: Date;
}
