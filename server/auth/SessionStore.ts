import { createHash } from 'node:crypto';
import session, { type SessionData } from 'express-session';
import type { DataSource } from 'typeorm';
import { UserSession } from '../entities/UserSession.ts';

const idleMs = 60 * 60_000;
const absoluteMs = 12 * 60 * 60_000;
/** How stale "last seen" may get before a request writes it again. */
const seenGrainMs = 30_000;

type Callback = (error?: unknown) => void;

/**
 * Sessions in the database. `set` and `touch` only ever update: a request in flight cannot bring
 * a signed-out session back. `open` is the one way in. Idle limit 60 minutes, absolute 12 hours.
 */
export class SessionStore extends session.Store {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: () => Date,
  ) {
    super();
  }

  /** Starts a session for a person, before express-session writes its data. */
  async open(sid: string, userId: number): Promise<void> {
    const now = this.clock();
    await this.sessions.insert({
      idHash: hashOf(sid),
      userId,
      data: '{}',
      openedAt: now,
      seenAt: now,
    });
  }

  override get(sid: string, callback: (error: unknown, data?: SessionData | null) => void): void {
    this.read(sid).then(
      (data) => callback(null, data),
      (error: unknown) => callback(error),
    );
  }

  override set(sid: string, data: SessionData, callback: Callback = () => undefined): void {
    this.sessions
      .update({ idHash: hashOf(sid) }, { data: JSON.stringify(data), seenAt: this.clock() })
      .then(() => callback(), callback);
  }

  override touch(sid: string, _data: SessionData, callback: Callback = () => undefined): void {
    const now = this.clock();
    const grain = new Date(now.getTime() - seenGrainMs);
    this.sessions
      .createQueryBuilder()
      .update()
      .set({ seenAt: now })
      .where('id_hash = :id AND seen_at < :grain', { id: hashOf(sid), grain })
      .execute()
      .then(() => callback(), callback);
  }

  override destroy(sid: string, callback: Callback = () => undefined): void {
    this.sessions.delete({ idHash: hashOf(sid) }).then(() => callback(), callback);
  }

  /** Removes what has run out; called now and then. */
  async sweep(): Promise<void> {
    const now = this.clock().getTime();
    await this.sessions
      .createQueryBuilder()
      .delete()
      .where('seen_at < :idle OR opened_at < :absolute', {
        idle: new Date(now - idleMs),
        absolute: new Date(now - absoluteMs),
      })
      .execute();
  }

  private get sessions() {
    return this.dataSource.getRepository(UserSession);
  }

  private async read(sid: string): Promise<SessionData | null> {
    const row = await this.sessions.findOneBy({ idHash: hashOf(sid) });
    if (row === null) return null;
    const now = this.clock().getTime();
    if (now - row.seenAt.getTime() > idleMs || now - row.openedAt.getTime() > absoluteMs)
      return null;
    return JSON.parse(row.data) as SessionData;
  }
}

/** A stolen copy of the table opens no session. */
function hashOf(sid: string): string {
  return createHash('sha256').update(sid).digest('hex');
}
