import { z } from 'zod';

/** A row's identity on the wire. */
export const idSchema = z.number().int().positive();

/** An identity in a path or a query: decimal digits only (`1e3` and ` 1` are refused). */
export const idParamSchema = z
  .string()
  .regex(/^[1-9][0-9]{0,14}$/, 'must be a whole number above 0')
  .transform(Number);

/** Every change names the version it was made on; a stale one is answered 409. */
export const versionSchema = z.number().int().min(1);

/** ISO 8601 UTC. */
export const instantSchema = z.iso.datetime();

/** One line of text without control or bidirectional marks. */
export function lineSchema(max: number) {
  return z
    .string()
    .trim()
    .min(1, 'must not be empty')
    .max(max, `must be at most ${max} characters`)
    .regex(/^[^\p{Cc}\u202A-\u202E\u2066-\u2069]*$/u, 'must not hold control characters');
}

/** Free text of a remark or a reason. */
export const remarkSchema = z.string().trim().max(5000, 'must be at most 5000 characters');

/** A reason is never empty: an auditor reads it a year later. */
export const reasonSchema = remarkSchema.min(3, 'give a reason of at least 3 characters');

/** Below this nothing is a quantity of a bench, and its squares and quotients leave the doubles. */
const smallest = 1e-12;
export const positive = z
  .number()
  .positive('must be above 0')
  .min(smallest, `must be at least ${smallest}`);
export const nonNegative = z.number().nonnegative('must be 0 or more');

export const pageQuery = {
  page: z
    .string()
    .regex(/^[1-9][0-9]{0,6}$/, 'must be a whole number from 1')
    .transform(Number)
    .default(1),
  pageSize: z
    .string()
    .regex(/^[1-9][0-9]{0,2}$/, 'must be a whole number from 1 to 200')
    .transform(Number)
    .refine((n) => n <= 200, 'must be at most 200')
    .default(50),
};

export function pageOf<T extends z.ZodType>(item: T) {
  return z.object({
    items: z.array(item),
    total: z.number().int(),
    page: z.number().int(),
    pageSize: z.number().int(),
  });
}

export type Page<T> = { items: T[]; total: number; page: number; pageSize: number };
