import Papa from 'papaparse';
import { readCell, type Cell } from './cell-value.js';

export type Delimiter = '\t' | ';' | ',' | '|' | ' ';
export interface Separators {
  readonly delimiter: Delimiter;
  readonly decimalMark: '.' | ',';
}

/** In the order in which they are preferred where several explain the same rows. */
export const separatorChoices: readonly Separators[] = [
  { delimiter: '\t', decimalMark: '.' }, { delimiter: '\t', decimalMark: ',' }, { delimiter: ';', decimalMark: '.' }, { delimiter: ';', decimalMark: ',' },
  { delimiter: ',', decimalMark: '.' }, { delimiter: '|', decimalMark: '.' }, { delimiter: '|', decimalMark: ',' }, { delimiter: ' ', decimalMark: '.' }, { delimiter: ' ', decimalMark: ',' },
];

/** Names of separators as they are shown. */
export const delimiterNames: Readonly<Record<Delimiter, string>> = { '\t': 'tab', ';': 'semicolon', ',': 'comma', '|': 'bar', ' ': 'blanks' };

/** A line with quoted cells, as people's spreadsheets write them. */
function splitQuoted(line: string, delimiter: string): string[] {
  const plain = line.split(delimiter);
  if (plain.every((cell) => (cell.split('"').length - 1) % 2 === 0)) return plain.map((cell) => cell.trim().replaceAll('"', ''));
  return Papa.parse<string[]>(line, { delimiter, skipEmptyLines: false }).data[0] ?? [];
}

/** The cells of a line. Blanks part as one; a separator at the end makes no cell of its own. */
export function splitCells(line: string, delimiter: Delimiter): string[] {
  if (delimiter === ' ') return line.trim().split(/[ \t]+/);
  const cells = line.includes('"') ? splitQuoted(line, delimiter) : line.split(delimiter);
  while (cells.length > 1 && (cells.at(-1) ?? '').trim() === '') cells.pop();
  return cells;
}

/** The cells of a line as a row of numbers; null where it is none. */
export function readRow(line: string, { delimiter, decimalMark }: Separators): Cell[] | null {
  const cells = splitCells(line, delimiter);
  const row: Cell[] = [];
  let numbers = 0;
  for (const raw of cells) {
    const cell = readCell(raw, decimalMark);
    if (cell.kind === 'text') return null;
    if (cell.kind === 'number') numbers += 1;
    row.push(cell);
  }
  return numbers === 0 ? null : row;
}
