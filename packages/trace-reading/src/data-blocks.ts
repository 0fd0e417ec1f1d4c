import { valueAt } from '@leeside/units/value-at';
import { readCell, type Cell } from './cell-value.js';
import { refuse, type Refusal } from './reading-fault.js';
import { readingLimits } from './reading-limits.js';
import { readRow, splitCells, type Separators } from './separators.js';
import { lineAt, type TextLines } from './text-lines.js';
import { scanEnd, scanNumber } from './scan-number.js';

/** A run of rows with the same number of columns, by column: one long array a column, NaN where a cell has no value. */
export interface DataBlock {
  readonly firstLine: number;
  readonly lastLine: number;
  /** Line of each row. */
  readonly lines: Uint32Array;
  readonly columns: readonly Float64Array[];
  /** Units glued to the cells of each column in the first row. */
  readonly gluedUnits: readonly string[];
  readonly rowCount: number;
  readonly noValueCount: number;
  readonly strayUnits: readonly StrayUnit[];
}

function pastBlanks(text: string, from: number, end: number): number {
  let at = from;
  while (at < end && text.charCodeAt(at) === 32) at += 1;
  return at;
}

/** Reads plain rows of numbers without making an object a cell; false where the line needs the slow way. */
function scanPlainRow(lines: TextLines, line: number, { delimiter, decimalMark }: Separators, row: Float64Array): boolean {
  if (delimiter === ' ') return false;
  const { text } = lines;
  const [end, mark, separator] = [valueAt(lines.end, line), decimalMark.charCodeAt(0), delimiter.charCodeAt(0)];
  let at = valueAt(lines.start, line);
  for (let column = 0; column < row.length; column += 1) {
    const value = scanNumber(text, pastBlanks(text, at, end), end, mark);
    if (!(Math.abs(value) < largestPlain)) return false;
    at = pastBlanks(text, scanEnd.at, end);
    const isAtEnd = at >= end;
    if (isAtEnd ? column < row.length - 1 : text.charCodeAt(at) !== separator) return false;
    at += 1;
    row[column] = value;
  }
  return at >= end;
}

const largestPlain = 9e36;

/** Columns that grow as rows come. */
class GrowingColumns {
  private capacity = 1024;
  count = 0;
  noValueCount = 0;
  columns: Float64Array[];
  lines = new Uint32Array(this.capacity);

  constructor(readonly width: number) {
    this.columns = Array.from({ length: width }, () => new Float64Array(this.capacity));
  }

  add(line: number, valueAt: (column: number) => number): void {
    if (this.count === this.capacity) this.grow();
    this.lines[this.count] = line;
    this.columns.forEach((column, place) => {
      column[this.count] = valueAt(place);
    });
    this.count += 1;
  }

  private grow(): void {
    this.capacity *= 2;
    this.columns = this.columns.map((column) => {
      const larger = new Float64Array(this.capacity);
      larger.set(column);
      return larger;
    });
    const lines = new Uint32Array(this.capacity);
    lines.set(this.lines);
    this.lines = lines;
  }
}

const isBlank = (text: string): boolean => text.trim() === '';
const valueOf = (row: readonly Cell[], column: number): number => (row[column]?.kind === 'number' ? row[column].value : NaN);

function rejectOutOfRange(row: readonly Cell[], line: number): void {
  const column = row.findIndex((cell) => cell.kind === 'number' && !Number.isFinite(cell.value));
  if (column >= 0) throw refuse('number-out-of-range', `Line ${line + 1}, column ${column + 1}: the number is too large to be one.`, line + 1, column + 1);
}

/** A line in the middle of data that is no row of this width: a fault where data go on after it, the end of the block where they do not. */
function explainBreak(lines: TextLines, line: number, separators: Separators, width: number): void {
  const following = lineAt(lines, line + 1);
  const next = isBlank(following) ? null : readRow(following, separators);
  if (next?.length === width) explainLine(lineAt(lines, line), line, separators, width);
}

function explainLine(text: string, line: number, separators: Separators, width: number): void {
  const row = readRow(text, separators);
  if (row !== null) throw refuse('ragged-row', `Line ${line + 1} has ${row.length} value${row.length === 1 ? '' : 's'}, expected ${width}.`, line + 1);
  const cells = splitCells(text, separators.delimiter);
  const bad = cells.findIndex((cell) => readCell(cell, separators.decimalMark).kind === 'text');
  if (cells.length === width && bad >= 0) throw refuse('bad-number', `Line ${line + 1}, column ${bad + 1}: "${(cells[bad] ?? '').trim().slice(0, 40)}" is no number.`, line + 1, bad + 1);
  if (cells.length === 1 && /\d/.test(text)) throw refuse('mixed-delimiters', `Line ${line + 1} is separated in another way than the lines before it.`, line + 1);
}

/** A unit that stands in a cell although the first row has none there. */
export interface StrayUnit {
  readonly unit: string;
  readonly line: number;
  readonly column: number;
}

/** Units glued to cells whose column has none in its first row; one that differs from the first row's is refused. */
function strayUnitsOf(row: readonly Cell[], first: readonly Cell[], line: number): StrayUnit[] {
  return row.flatMap(({ kind, unit }, column) => {
    const usual = first[column]?.unit ?? '';
    if (kind !== 'number' || unit === '' || unit.toLowerCase() === usual.toLowerCase()) return [];
    if (usual !== '') throw strayUnitRefusal({ unit, line, column });
    return [{ unit, line, column }];
  });
}

/** What is said of a unit that is not its column's. */
export function strayUnitRefusal({ unit, line, column }: StrayUnit): Refusal {
  return refuse('unit-conflict', `Line ${line + 1}, column ${column + 1}: the unit "${unit}" is not that of the column.`, line + 1, column + 1);
}

/** A row whose last cells are empty, brought to its width: the separators at its end stand for them. */
function paddedRow(row: Cell[] | null, text: string, { delimiter }: Separators, width: number): Cell[] | null {
  if (row === null || row.length >= width || !text.trimEnd().endsWith(delimiter.trimEnd() || '\u0000')) return row;
  return [...row, ...Array.from({ length: width - row.length }, (): Cell => ({ kind: 'empty', value: NaN, unit: '' }))];
}

/** The block that begins at a line; null where that line is no row. */
function blockAt(lines: TextLines, firstLine: number, separators: Separators): DataBlock | null {
  const first = readRow(lineAt(lines, firstLine), separators);
  if (first === null) return null;
  if (first.length > readingLimits.columns) throw refuse('too-many-columns', `Line ${firstLine + 1} has ${first.length} columns; the limit is ${readingLimits.columns}.`, firstLine + 1);
  const growing = new GrowingColumns(first.length);
  const strayUnits: StrayUnit[] = [];
  const plain = new Float64Array(first.length);
  let line = firstLine;
  let lastLine = firstLine;
  for (; line < lines.count; line += 1) {
    if (scanPlainRow(lines, line, separators, plain)) growing.add(line, (column) => plain[column] ?? NaN);
    else {
      const text = lineAt(lines, line);
      if (isBlank(text)) continue;
      const row = paddedRow(readRow(text, separators), text, separators, first.length);
      if (row?.length !== first.length) {
        explainBreak(lines, line, separators, first.length);
        break;
      }
      rejectOutOfRange(row, line);
      strayUnits.push(...strayUnitsOf(row, first, line));
      growing.noValueCount += row.filter((cell) => cell.kind !== 'number').length;
      growing.add(line, (column) => valueOf(row, column));
    }
    lastLine = line;
  }
  return {
    firstLine, lastLine, lines: growing.lines.subarray(0, growing.count), columns: growing.columns.map((column) => column.subarray(0, growing.count)), gluedUnits: first.map((cell) => cell.unit),
    rowCount: growing.count, noValueCount: growing.noValueCount, strayUnits,
  };
}

/**
 * All blocks of rows of a file under given separators. Blank lines part nothing.
 * @param lines the file.
 * @param separators separator and decimal mark.
 */
export function findDataBlocks(lines: TextLines, separators: Separators): DataBlock[] {
  const blocks: DataBlock[] = [];
  for (let line = 0; line < lines.count; line += 1) {
    const block = blockAt(lines, line, separators);
    if (block === null) continue;
    blocks.push(block);
    line = block.lastLine;
  }
  return blocks;
}
