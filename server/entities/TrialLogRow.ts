import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { LogMapping, LogProblem } from '../../shared/schemas/trialLog.ts';
import { jsonText } from '../database/jsonText.ts';

/** One uploaded file: its bytes, how it was read, what was refused and why. Never changed. */
@Entity('trial_log')
export class TrialLogRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ name: 'file_name', type: 'varchar', length: 200 })
  fileName!: string;

  @Column({ type: 'int', unsigned: true })
  size!: number;

  /** Unique within the fixture: the same file twice is one log. */
  @Column({ type: 'char', length: 64 })
  sha256!: string;

  /** Read only when the file itself is asked for. */
  @Column({ type: 'longblob', select: false })
  raw!: Buffer;

  @Column({ type: 'int', unsigned: true })
  accepted!: number;

  @Column({ type: 'int', unsigned: true })
  refused!: number;

  @Column({ type: 'longtext', transformer: jsonText })
  problems!: LogProblem[];

  @Column({ type: 'longtext', transformer: jsonText })
  mapping!: LogMapping;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;

  @Column({ name: 'created_by', type: 'varchar', length: 120 })
  createdBy!: string;
}
