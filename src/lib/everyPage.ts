import type { Page } from '../../shared/schemas/common.ts';
import { api } from './api.ts';

const largestPage = 200;

/** Every item of a paged list, for pictures that show all of it. */
export async function everyPage<T>(path: string, signal: AbortSignal): Promise<T[]> {
  const get = (page: number) =>
    api<Page<T>>(`${path}?page=${page}&pageSize=${largestPage}`, { signal });
  const first = await get(1);
  const pages = Math.ceil(first.total / largestPage);
  const rest = await Promise.all(
    Array.from({ length: Math.max(pages - 1, 0) }, (_, i) => get(i + 2)),
  );
  return [first, ...rest].flatMap(({ items }) => items);
}
