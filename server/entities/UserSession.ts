import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A signed-in session. The identity in the cookie is kept only as its SHA-256. */
@Entity('user_session')
export class UserSession {
  @PrimaryColumn({ name: 'id_hash', type: 'char', length: 64 })
  idHash!: string;

  @Column({ name: 'user_id', type: 'int', unsigned: true })
  userId!: number;

  @Column({ type: 'text' })
  data!: string;

  @Column({ name: 'opened_at', type: 'datetime', precision: 3 })
  openedAt!: Date;

  @Column({ name: 'seen_at', type: 'datetime', precision: 3 })
  seenAt!: Date;
}
