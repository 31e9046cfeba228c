import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { FrictionKind, InclineReading } from '../../shared/schemas/frictionTest.ts';
import { jsonText } from '../database/jsonText.ts';

@Entity('friction_test')
export class FrictionTestRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ type: 'varchar', length: 20 })
  kind!: FrictionKind;

  @Column({ type: 'varchar', length: 60, nullable: true })
  face!: string | null;

  @Column({ type: 'varchar', length: 120 })
  surfaces!: string;

  @Column({ type: 'varchar', length: 60, nullable: true })
  batch!: string | null;

  @Column({ name: 'tested_on', type: 'char', length: 10 })
  testedOn!: string;

  @Column({ type: 'text', transformer: jsonText })
  readings!: InclineReading[];

  @Column({ name: 'reading_uncertainty', type: 'double' })
  readingUncertainty!: number;

  @Column({ type: 'text', nullable: true })
  remark!: string | null;

  @Column({ type: 'boolean' })
  excluded!: boolean;

  @Column({ name: 'excluded_reason', type: 'text', nullable: true })
  excludedReason!: string | null;

  @Column({ type: 'int', unsigned: true })
  version!: number;

  @Column({ name: 'created_at', type: 'datetime', precision: 6 })
  createdAt!: Date;

  @Column({ name: 'created_by', type: 'varchar', length: 120 })
  createdBy!: string;
}
