import { headerMeaning, type HeaderMeaning } from './headerWords.ts';
import { isUnit } from './recogniseUnit.ts';

/** A header taken apart: its words without the unit, the unit as written, and what it means. */
export type ReadHeader = { name: string; unit: string | null; meaning: HeaderMeaning | null };

/** Longer headers are not looked into: nobody names a column like that. */
const longest = 120;

/**
 * Takes a header apart. A unit stands in brackets at the end (`Accel [deg/s²]`), after a comma or
 * slash-free blank (`position mm`), or as a suffix (`position_mm`, `alpha_rad_s2`).
 */
export function readHeader(header: string): ReadHeader {
  const text = header.normalize('NFC').trim();
  if (text.length > longest) return { name: text, unit: null, meaning: null };
  const bracket = bracketed(text);
  if (bracket) return meaningOf(bracket.name, bracket.unit);

  const plain = meaningOf(text, null);
  if (plain.meaning) return plain;
  return suffixed(plain.name) ?? plain;
}

/** `name (unit)` or `name [unit]`; brackets are looked up by position, not by a pattern. */
function bracketed(text: string): { name: string; unit: string } | null {
  const closing = text.at(-1);
  const opening = closing === ')' ? '(' : closing === ']' ? '[' : null;
  if (!opening) return null;
  const at = text.lastIndexOf(opening);
  if (at <= 0) return null;
  return { name: text.slice(0, at), unit: text.slice(at + 1, -1).trim() };
}

/** `position mm`, `alpha rad s2`, `alpha in deg/s²`: the last one to three words are the unit. */
function suffixed(name: string): ReadHeader | null {
  const parts = name.split(' ');
  for (let count = Math.min(3, parts.length - 1); count >= 1; count--) {
    const tail = parts.slice(-count);
    const unit = [tail.join('/'), tail.join('')].find(isUnit);
    if (unit === undefined) continue;
    const rest = parts.slice(0, -count).filter((part, index, all) => {
      return !(part === 'in' && index === all.length - 1 && all.length > 1);
    });
    const found = meaningOf(rest.join(' '), unit);
    if (found.meaning) return found;
  }
  return null;
}

function meaningOf(raw: string, unit: string | null): ReadHeader {
  const name = raw
    .toLowerCase()
    .replace(/[_\-.,:;]/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();
  return { name, unit, meaning: headerMeaning(name) ?? null };
}
