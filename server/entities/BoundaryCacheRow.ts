import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { AnalysisResult } from '../../shared/schemas/analysis.ts';
import type { Verdict } from '../../shared/schemas/verdict.ts';
import { jsonText } from '../database/jsonText.ts';

/** The analysis of a fixture's trials as they are, at default options. Derived; may be dropped. */
@Entity('boundary_cache')
export class BoundaryCacheRow {
  @PrimaryColumn({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ name: 'data_version', type: 'int', unsigned: true })
  dataVersion!: number;

  @Column({ type: 'varchar', length: 40 })
  engine!: string;

  @Column({ type: 'char', length: 64 })
  digest!: string;

  @Column({ type: 'varchar', length: 20 })
  verdict!: Verdict;

  /** Place of the verdict from worst (0) to best, to sort by. */
  @Column({ name: 'verdict_rank', type: 'int', unsigned: true })
  verdictRank!: number;

  @Column({ type: 'text' })
  sentence!: string;

  /** Coefficient of friction of the bench tests: kinetic, else static. */
  @Column({ name: 'bench_mu', type: 'double', nullable: true })
  benchMu!: number | null;

  @Column({ type: 'longtext', nullable: true, transformer: jsonText })
  result!: AnalysisResult | null;
}
