import type { LogMapping, LogMappingInput } from '../schemas/trialLog.ts';
import { readHeader } from './readHeader.ts';
import { splitLine } from './splitLine.ts';

export type Delimiter = LogMapping['delimiter'];

/** Where the table of a log begins. */
export type HeaderPlace = {
  delimiter: Delimiter;
  /** Line of the header, counted from 1. */
  line: number;
  /** Offset of that line in the text. */
  offset: number;
};

const delimiters: Delimiter[] = [',', ';', '\t'];

/** Sheets carry a title block above their table; it is not longer than this. */
const preambleLines = 60;

/** A line this long is not a header; it would only cost time. */
const longestHeader = 65_536;

/**
 * Finds the header line and the delimiter together: the line and delimiter that give the most
 * columns a meaning. Without any, the first line that splits into more than one cell.
 *
 * @param text - with `\n` line ends
 */
export function findHeader(text: string, given: LogMappingInput): HeaderPlace {
  const wanted = new Set(Object.values(given.columns ?? {}).map((header) => header.trim()));
  const tried = given.delimiter ? [given.delimiter] : delimiters;
  let best: HeaderPlace | null = null;
  let bestScore = 0;
  let fallback: HeaderPlace | null = null;
  let offset = 0;
  for (let line = 1; line <= preambleLines && offset < text.length; line++) {
    const end = text.indexOf('\n', offset);
    const content = text.slice(offset, end < 0 ? text.length : end);
    if (content.length <= longestHeader) {
      for (const delimiter of tried) {
        const cells = splitLine(content, delimiter);
        const place = { delimiter, line, offset };
        const score = scoreOf(cells, wanted);
        if (score > bestScore) {
          bestScore = score;
          best = place;
        }
        if (cells.length > 1) fallback ??= place;
      }
    }
    if (end < 0) break;
    offset = end + 1;
  }
  return best ?? fallback ?? { delimiter: tried[0], line: 1, offset: 0 };
}

/** Distinct meanings among the cells; a header the mapping names counts for several. */
function scoreOf(cells: readonly string[], wanted: ReadonlySet<string>): number {
  if (cells.length < 2) return 0;
  const meanings = new Set<string>();
  let named = 0;
  for (const cell of cells) {
    if (cell !== '' && wanted.has(cell)) named++;
    const { meaning } = readHeader(cell);
    if (meaning) meanings.add(meaning.field);
  }
  // one known word in a sentence of the preamble is no header
  return named > 0 || meanings.size >= 2 ? named * 10 + meanings.size : 0;
}
