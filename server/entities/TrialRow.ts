import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { Judgement, Outcome } from '../../shared/schemas/trial.ts';

/** One trial. Excluded with a reason when it must not count; never deleted. */
@Entity('trial')
export class TrialRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ name: 'log_id', type: 'int', unsigned: true })
  logId!: number;

  @Column({ name: 'configuration_id', type: 'int', unsigned: true })
  configurationId!: number;

  /** Line of the log. */
  @Column({ name: 'log_row', type: 'int', unsigned: true })
  row!: number;

  @Column({ type: 'double' })
  acceleration!: number;

  @Column({ type: 'varchar', length: 10 })
  outcome!: Outcome;

  @Column({ name: 'judged_by', type: 'varchar', length: 20, nullable: true })
  judgedBy!: Judgement | null;

  @Column({ name: 'slip_angle', type: 'double', nullable: true })
  slipAngle!: number | null;

  @Column({ name: 'run_order', type: 'double', nullable: true })
  order!: number | null;

  @Column({ type: 'datetime', precision: 6, nullable: true })
  at!: Date | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  direction!: string | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  part!: string | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  seating!: string | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  series!: string | null;

  @Column({ type: 'varchar', length: 60, nullable: true })
  batch!: string | null;

  @Column({ type: 'double', nullable: true })
  temperature!: number | null;

  @Column({ type: 'text', nullable: true })
  remark!: string | null;

  @Column({ type: 'boolean' })
  excluded!: boolean;

  @Column({ name: 'excluded_reason', type: 'text', nullable: true })
  excludedReason!: string | null;

  @Column({ name: 'excluded_by', type: 'varchar', length: 120, nullable: true })
  excludedBy!: string | null;

  @Column({ name: 'excluded_at', type: 'datetime', precision: 6, nullable: true })
  excludedAt!: Date | null;

  @Column({ type: 'int', unsigned: true })
  version!: number;
}
