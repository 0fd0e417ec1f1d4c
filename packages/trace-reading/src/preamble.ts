import { leadingKey, preambleKeyOf, type PreambleKey } from './setting-words.js';
import { readingLimits } from './reading-limits.js';
import { refuse } from './reading-fault.js';
import { lineAt, type TextLines } from './text-lines.js';

/** One key with its value, as they stand. */
export interface PreambleEntry {
  readonly key: PreambleKey;
  /** The value with a unit that stands in a cell of its own; several cells are joined by "|". */
  readonly value: string;
  /** A unit within the key, such as "RBW (Hz)". */
  readonly keyText: string;
  /** Line, from 0. */
  readonly line: number;
}

const comment = /^\s*(?:[#!%*;]+|\/\/|REM\b)\s*/i;

/** A line without its comment sign. */
export function withoutCommentSign(text: string): string {
  return text.replace(comment, '');
}

const switches = new Set(['auto', 'man', 'manual']);

function entriesOfCells(cells: readonly string[], line: number): PreambleEntry[] {
  const entries: PreambleEntry[] = [];
  for (let at = 0; at < cells.length - 1; at += 1) {
    const keyText = cells[at] ?? '';
    const key = preambleKeyOf(keyText);
    if (key === null) continue;
    const values: string[] = [];
    for (let next = at + 1; next < cells.length && preambleKeyOf(cells[next] ?? '') === null; next += 1) values.push((cells[next] ?? '').trim());
    const given = values.filter((value) => value !== '' && !switches.has(value.toLowerCase()));
    if (given.length > 0) entries.push({ key, value: given.join('|'), keyText, line });
    at += values.length;
  }
  return entries;
}

function entryByMark(text: string, line: number): PreambleEntry | null {
  const parts = /^([^:=]{1,60})[:=]\s*(.+)$/.exec(text);
  const keyText = parts?.[1] ?? '';
  const key = preambleKeyOf(keyText);
  const value = (parts?.[2] ?? '').replace(/[,;]\s*$/, '').trim();
  return key === null || value === '' ? null : { key, value, keyText, line };
}

function entriesOfLine(raw: string, line: number): PreambleEntry[] {
  const text = withoutCommentSign(raw);
  const byMark = entryByMark(text, line);
  for (const delimiter of ['\t', ';', ',', '|']) {
    if (!text.includes(delimiter)) continue;
    const cells = text.split(delimiter).map((cell) => cell.trim().replace(/^"(.*)"$/, '$1').replace(/[:=]$/, '')).flatMap((cell) => {
      const inner = /^([^:=]{1,60})[:=]\s*(.+)$/.exec(cell);
      return inner !== null && preambleKeyOf(inner[1] ?? '') !== null ? [inner[1] ?? '', inner[2] ?? ''] : [cell];
    });
    const found = entriesOfCells(cells, line);
    if (found.length > 0) return byMark !== null && !found.some((entry) => entry.key === byMark.key) ? [byMark] : found;
  }
  if (byMark !== null) return [byMark];
  const leading = leadingKey(text);
  return leading === null ? [] : [{ key: leading.key, value: leading.rest, keyText: leading.key, line }];
}

/** The preamble: what stands before the data, line by line, and the keys that were understood. */
export interface Preamble {
  readonly entries: readonly PreambleEntry[];
  readonly lines: readonly { readonly text: string; readonly line: number }[];
}

/** Reads the lines of a range as keys and values. */
export function readPreamble(lines: TextLines, from: number, to: number): Preamble {
  if (to - from > readingLimits.preambleLines) throw refuse('preamble-too-long', `The data begin only after ${to - from} lines; the limit is ${readingLimits.preambleLines}.`, to + 1);
  const texts = Array.from({ length: to - from }, (_, at) => ({ text: lineAt(lines, from + at), line: from + at })).filter(({ text }) => text.trim() !== '');
  return { lines: texts, entries: texts.flatMap(({ text, line }) => entriesOfLine(text, line)) };
}

/** The last entry of a key; later sections are nearer to the data. */
export function entryOf(preamble: Preamble, key: PreambleKey): PreambleEntry | null {
  return preamble.entries.findLast((entry) => entry.key === key) ?? null;
}
