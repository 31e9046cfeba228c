import type { LogMapping } from '../schemas/trialLog.ts';
import { decodeWindows1252 } from './decodeWindows1252.ts';

export type Encoding = LogMapping['encoding'];

export type Decoded =
  | { ok: true; text: string; encoding: Encoding }
  | { ok: false; unsupported: boolean; reason: string };

/** First bytes of files that are not text, and what a person calls them. */
const formats: [string, number[]][] = [
  ['a zipped file or workbook', [0x50, 0x4b]],
  ['a gzip file', [0x1f, 0x8b]],
  ['a PDF', [0x25, 0x50, 0x44, 0x46]],
  ['an old workbook', [0xd0, 0xcf, 0x11, 0xe0]],
];

/**
 * Bytes of a log as text with `\n` line ends: UTF-8 with or without a byte-order mark, UTF-16 with
 * one, else Windows-1252. Files that are not text are refused by their first bytes, whatever their
 * name; so is anything with a NUL in it.
 */
export function decodeText(bytes: Uint8Array): Decoded {
  for (const [name, magic] of formats) {
    if (bytes.length >= magic.length && magic.every((byte, index) => bytes[index] === byte)) {
      return {
        ok: false,
        unsupported: true,
        reason: `This is ${name}, not text: save the sheet as CSV and send that.`,
      };
    }
  }
  const found = decode(bytes);
  if (found === null) return refuse('The bytes are neither UTF-8 nor UTF-16: save as CSV UTF-8.');
  if (found.text.includes('\0')) {
    return refuse('The file holds NUL characters, so it is not plain text: save it as CSV UTF-8.');
  }
  const text = found.text.replace(/\r\n?/g, '\n');
  if (text.trim() === '') return refuse('The file is empty: it needs a header line and rows.');
  return { ok: true, text, encoding: found.encoding };
}

function decode(bytes: Uint8Array): { text: string; encoding: Encoding } | null {
  const [first, second] = bytes;
  const wide = first === 0xff && second === 0xfe ? 'utf-16le' : null;
  const encoding = first === 0xfe && second === 0xff ? 'utf-16be' : wide;
  try {
    if (encoding) {
      return { text: new TextDecoder(encoding, { fatal: true }).decode(bytes), encoding };
    }
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), encoding: 'utf-8' };
  } catch {
    if (encoding) return null;
    return { text: decodeWindows1252(bytes), encoding: 'windows-1252' };
  }
}

function refuse(reason: string): Decoded {
  return { ok: false, unsupported: false, reason };
}
