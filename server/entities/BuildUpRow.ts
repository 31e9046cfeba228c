import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { BuildUpInput } from '../../shared/schemas/buildUp.ts';
import { jsonText } from '../database/jsonText.ts';

/** One revision of a build-up; never changed. */
@Entity('build_up')
export class BuildUpRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ type: 'int', unsigned: true })
  revision!: number;

  @Column({ type: 'longtext', transformer: jsonText })
  content!: Pick<BuildUpInput, 'bodies' | 'slide' | 'relativeUncertainty' | 'remark'>;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;

  @Column({ name: 'created_by', type: 'varchar', length: 120 })
  createdBy!: string;
}
