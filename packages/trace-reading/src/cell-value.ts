import { scanEnd, scanNumber } from './scan-number.js';
import { frequencyUnitOf, levelUnitOf } from './unit-words.js';

/** What a cell holds. A value that the analyzer marked as none is a gap, never a zero. */
type CellKind = 'number' | 'empty' | 'no value' | 'text';
export interface Cell {
  readonly kind: CellKind;
  readonly value: number;
  /** A unit glued to the number, as written. */
  readonly unit: string;
}

const noValueWords = /^(?:-{2,}|\*+|nan|[+-]?inf(?:inity)?|-?1\.#(?:ind|qnan|inf)|ovld|over(?:load)?|n\/?a|<\s*-?\d+(?:[.,]\d+)?|>\s*-?\d+(?:[.,]\d+)?)$/i;
const largestValue = 9e36;
const groupMarks = "'\u2019\u00a0\u2009\u202f";
const emptyCell: Cell = { kind: 'empty', value: NaN, unit: '' };
const noValue: Cell = { kind: 'no value', value: NaN, unit: '' };
const textCell: Cell = { kind: 'text', value: NaN, unit: '' };

/** Takes thousands marks out where they part whole groups of three; null where they do not. */
function withoutGroups(text: string, mark: '.' | ','): string | null {
  const other = mark === ',' ? '.' : ',';
  const grouped = new RegExp(`^([+\\-\u2212]?\\d{1,3})((?:[${groupMarks}${other}]\\d{3})+)(?![\\d${groupMarks}${other}])(.*)$`).exec(text);
  return grouped ? `${grouped[1]}${(grouped[2] ?? '').replace(/\D/g, '')}${grouped[3] ?? ''}` : null;
}

/**
 * Reads a cell by the strict grammar.
 * @param raw the cell as it stands between two separators.
 * @param mark decimal mark.
 * @example readCell('-31,5dBm', ',') // { kind: 'number', value: -31.5, unit: 'dBm' }
 */
export function readCell(raw: string, mark: '.' | ','): Cell {
  const text = raw.trim().replace(/^"(.*)"$/, '$1').trim();
  if (text === '') return emptyCell;
  if (noValueWords.test(text)) return noValue;
  const value = scanNumber(text, 0, text.length, mark.charCodeAt(0));
  if (Number.isNaN(value)) return textCell;
  if (scanEnd.at === text.length) return Math.abs(value) >= largestValue && Number.isFinite(value) ? noValue : { kind: 'number', value, unit: '' };
  const rest = text.slice(scanEnd.at).trim();
  if (frequencyUnitOf(rest) !== null || levelUnitOf(rest) !== null) return { kind: 'number', value, unit: rest };
  const bare = withoutGroups(text, mark);
  return bare === null ? textCell : readCell(bare, mark);
}
