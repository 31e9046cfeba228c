import type { EntityManager } from 'typeorm';

export type Actor = { id: number; name: string };

export type NewEvent = {
  /** null = the system */
  actor: Actor | null;
  action: string;
  objectType: string;
  objectId: number | null;
  fixtureId: number | null;
  outcome?: 'done' | 'refused';
  summary: string;
  before?: unknown;
  after?: unknown;
  requestId?: string | null;
};

/**
 * Appends one line to the event log, in the transaction of the change it tells of, dated by the
 * database's clock (UTC, microseconds). The order of events is their id.
 */
export async function recordEvent(manager: EntityManager, event: NewEvent): Promise<void> {
  await manager.query(
    `INSERT INTO event
       (at, actor_id, actor, action, object_type, object_id, fixture_id, outcome, summary,
        before_json, after_json, request_id)
     VALUES (DATE_FORMAT(UTC_TIMESTAMP(6), '%Y-%m-%dT%H:%i:%s.%fZ'), ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)`,
    [
      event.actor?.id ?? null,
      event.actor?.name ?? null,
      event.action,
      event.objectType,
      event.objectId,
      event.fixtureId,
      event.outcome ?? 'done',
      event.summary.slice(0, 500),
      toJson(event.before),
      toJson(event.after),
      event.requestId ?? null,
    ],
  );
}

function toJson(value: unknown): string | null {
  return value === undefined || value === null ? null : JSON.stringify(value);
}
