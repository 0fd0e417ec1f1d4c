import { readCell } from './cell-value.js';
import { roleOfName } from './header-line.js';
import { decide, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';
import { splitCells, type Delimiter } from './separators.js';
import { lineAt, splitLines, type TextLines } from './text-lines.js';
import { frequencyUnitOf, levelUnitOf } from './unit-words.js';

const delimiters: readonly Delimiter[] = ['\t', ';', ',', '|'];
const fewestValues = 4;

interface NamedRow {
  readonly name: string;
  readonly cells: readonly string[];
}

/** A line that is a name followed by numbers alone. */
function namedRow(text: string, delimiter: Delimiter, mark: '.' | ','): NamedRow | null {
  const [first = '', second = '', ...rest] = splitCells(text, delimiter);
  const hasUnit = frequencyUnitOf(second) !== null || levelUnitOf(second) !== null;
  const name = hasUnit ? `${first} [${second.trim()}]` : first;
  const cells = hasUnit ? rest : [second, ...rest];
  if (cells.length < fewestValues || !/\p{L}/u.test(name) || readCell(name, mark).kind === 'number') return null;
  return cells.every((cell) => readCell(cell, mark).kind === 'number') ? { name: name.trim(), cells } : null;
}

interface Turned {
  readonly delimiter: Delimiter;
  readonly rows: readonly NamedRow[];
  readonly others: readonly string[];
}

function findTurned(lines: TextLines): Turned | null {
  if (lines.count > 600) return null;
  for (const delimiter of delimiters) {
    for (const mark of ['.', ','] as const) {
      const rows: NamedRow[] = [];
      const others: string[] = [];
      for (let line = 0; line < lines.count; line += 1) {
        const row = namedRow(lineAt(lines, line), delimiter, mark);
        if (row === null) others.push(lineAt(lines, line));
        else rows.push(row);
      }
      if (rows.length >= 2 && rows.some((row) => roleOfName(row.name) === 'frequency')) return { delimiter, rows, others };
    }
  }
  return null;
}

/** Whether a table lies on its side: a name, then all its numbers, on each line. */
export function isTransposed(lines: TextLines): boolean {
  return findTurned(lines) !== null;
}

/** Turns a table that lies on its side upright, so that it is read like any other. */
export function turnTable(notebook: Notebook, lines: TextLines): TextLines {
  const turned = findTurned(lines);
  if (turned === null) return lines;
  const { delimiter, others } = turned;
  const frequency = turned.rows.find((row) => roleOfName(row.name) === 'frequency');
  const rows = turned.rows.filter((row) => row.cells.length === frequency?.cells.length);
  if (rows.length < 2) throw refuse('ragged-row', 'The table lies on its side, and its lines differ in length.');
  decide(notebook, 'layout', 'the table lies on its side: one line a column');
  const upright = (frequency?.cells ?? []).map((_, at) => rows.map((row) => row.cells[at] ?? '').join(delimiter));
  return splitLines([...others, rows.map((row) => row.name).join(delimiter), ...upright].join('\n'));
}
