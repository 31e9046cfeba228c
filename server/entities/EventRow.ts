import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

/** One line of the event log. The application account may insert and read, nothing else. */
@Entity('event')
export class EventRow {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id!: string;

  /** Database clock, UTC, microseconds; text, since a JS date would drop them. */
  @Column({ type: 'varchar', length: 27 })
  at!: string;

  @Column({ name: 'actor_id', type: 'int', unsigned: true, nullable: true })
  actorId!: number | null;

  @Column({ type: 'varchar', length: 120, nullable: true })
  actor!: string | null;

  @Column({ type: 'varchar', length: 60 })
  action!: string;

  @Column({ name: 'object_type', type: 'varchar', length: 40 })
  objectType!: string;

  @Column({ name: 'object_id', type: 'int', unsigned: true, nullable: true })
  objectId!: number | null;

  @Column({ name: 'fixture_id', type: 'int', unsigned: true, nullable: true })
  fixtureId!: number | null;

  @Column({ type: 'enum', enum: ['done', 'refused'] })
  outcome!: 'done' | 'refused';

  @Column({ type: 'varchar', length: 500 })
  summary!: string;

  /** JSON text: a JSON column would turn the string "12" into a number. */
  @Column({ name: 'before_json', type: 'longtext', nullable: true })
  before!: string | null;

  @Column({ name: 'after_json', type: 'longtext', nullable: true })
  after!: string | null;

  @Column({ name: 'request_id', type: 'varchar', length: 60, nullable: true })
  requestId!: string | null;
}
