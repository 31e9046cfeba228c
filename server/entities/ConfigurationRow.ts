import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { MeasuredInertia } from '../../shared/schemas/configuration.ts';
import { jsonText } from '../database/jsonText.ts';

@Entity('configuration')
export class ConfigurationRow {
  @PrimaryGeneratedColumn({ type: 'int', unsigned: true })
  id!: number;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true })
  fixtureId!: number;

  @Column({ type: 'varchar', length: 40 })
  label!: string;

  @Column({ name: 'position_mm', type: 'double' })
  positionMm!: number;

  @Column({ name: 'measured_inertia', type: 'text', nullable: true, transformer: jsonText })
  measuredInertia!: MeasuredInertia | null;

  @Column({ type: 'int', unsigned: true })
  version!: number;
}
