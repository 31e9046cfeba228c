import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiError } from './api.ts';

/**
 * Puts what the server refused beside its fields.
 *
 * @returns the sentence for the whole form: what belongs to no field, or a hint to look above
 */
export function showServerErrors<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
): string {
  if (!(error instanceof ApiError)) return 'Something went wrong. Nothing was stored; try again.';
  for (const { path, message } of error.fields) {
    if (path !== '') setError(path as FieldPath<T>, { message });
  }
  if (error.fields.length === 0) return error.message;
  return `Not stored: ${error.fields.map(({ path, message }) => `${path} ${message}`).join('; ')}.`;
}

/** For a number that may be left empty: empty means null. */
export function numberOrNull(value: unknown): number | null {
  return value === '' || value === null || value === undefined ? null : Number(value);
}

/** For text that may be left empty: empty means null. */
export function textOrNull(value: unknown): string | null {
  return typeof value === 'string' && value.trim() !== '' ? value : null;
}
