import type { ValueTransformer } from 'typeorm';

/**
 * JSON kept as text: doubles come back bit for bit and the string "123" stays a string, which a
 * JSON column does not promise.
 */
export const jsonText: ValueTransformer = {
  to: (value: unknown) => (value === null || value === undefined ? value : JSON.stringify(value)),
  from: (text: string | null) => (text === null ? null : (JSON.parse(text) as unknown)),
};
