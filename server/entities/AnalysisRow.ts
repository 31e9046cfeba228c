import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type {
  AnalysisOptions,
  AnalysisRequest,
  AnalysisResult,
} from '../../shared/schemas/analysis.ts';
import { jsonText } from '../database/jsonText.ts';

/** A kept analysis: what went in, what came out. Never changed. */
@Entity('analysis')
export class AnalysisRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ type: 'char', length: 64 })
  digest!: string;

  @Column({ name: 'build_up_revision', type: 'int', unsigned: true, nullable: true })
  buildUpRevision!: number | null;

  /** The fixture's data version it was made on: a later one makes it older than the data. */
  @Column({ name: 'data_version', type: 'int', unsigned: true })
  dataVersion!: number;

  @Column({ type: 'longtext', transformer: jsonText })
  options!: AnalysisOptions;

  /** Everything that went in, so that it can be computed again; large, so read only when asked for. */
  @Column({ type: 'longtext', transformer: jsonText, select: false })
  request!: AnalysisRequest;

  @Column({ type: 'longtext', transformer: jsonText })
  result!: AnalysisResult;

  @Column({ type: 'text', nullable: true })
  note!: string | null;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;

  @Column({ name: 'created_by', type: 'varchar', length: 120 })
  createdBy!: string;
}
