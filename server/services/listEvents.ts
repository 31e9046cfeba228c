import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { Page } from '../../shared/schemas/common.ts';
import type { EventEntry, eventQuerySchema } from '../../shared/schemas/event.ts';
import { EventRow } from '../entities/EventRow.ts';

/** A page of a fixture's events, newest first; the order is the id, not the time. */
export async function listEvents(
  dataSource: DataSource,
  fixtureId: number,
  query: z.output<typeof eventQuerySchema>,
): Promise<Page<EventEntry>> {
  const { page, pageSize, action } = query;
  const [rows, total] = await dataSource.getRepository(EventRow).findAndCount({
    where: { fixtureId, ...(action === undefined ? {} : { action }) },
    order: { id: 'DESC' },
    skip: (page - 1) * pageSize,
    take: pageSize,
  });
  return { items: rows.map(toEvent), total, page, pageSize };
}

function toEvent(row: EventRow): EventEntry {
  return {
    id: Number(row.id),
    at: row.at,
    actor: row.actor,
    action: row.action,
    objectType: row.objectType,
    objectId: row.objectId,
    fixtureId: row.fixtureId,
    outcome: row.outcome,
    summary: row.summary,
    before: fromJson(row.before),
    after: fromJson(row.after),
  };
}

function fromJson(text: string | null): unknown {
  return text === null ? null : JSON.parse(text);
}
