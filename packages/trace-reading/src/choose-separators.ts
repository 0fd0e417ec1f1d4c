import { decide, ask, type Notebook } from './notebook.js';
import { delimiterNames, readRow, separatorChoices, splitCells, type Separators } from './separators.js';
import { lineAt, type TextLines } from './text-lines.js';

const sampledLines = 4000;

/** Lines spread over the whole file, its end included. */
function sampleOf(lines: TextLines): number[] {
  if (lines.count <= sampledLines) return Array.from({ length: lines.count }, (_, line) => line);
  const head = Array.from({ length: sampledLines / 2 }, (_, line) => line);
  const stride = (lines.count - head.length) / (sampledLines / 2);
  return [...head, ...Array.from({ length: sampledLines / 2 }, (_, at) => head.length + Math.floor(at * stride))];
}

interface Score {
  readonly separators: Separators;
  readonly rows: number;
  readonly columns: number;
}

function scoreOf(lines: TextLines, sample: readonly number[], separators: Separators): Score {
  const widths = new Map<number, number>();
  for (const line of sample) {
    const row = readRow(lineAt(lines, line), separators);
    if (row !== null) widths.set(row.length, (widths.get(row.length) ?? 0) + 1);
  }
  const [columns, rows] = [...widths].reduce((best, one) => (one[1] > best[1] || (one[1] === best[1] && one[0] > best[0]) ? one : best), [0, 0]);
  return { separators, rows, columns };
}

/** More rows explain the file better; with equally many, the separator that parts them into more than one column. */
function better(one: Score, other: Score): Score {
  if (other.columns > 1 && one.columns === 1 && other.rows >= one.rows) return other;
  if (one.columns > 1 && other.columns === 1 && one.rows >= other.rows * 0.98) return one;
  return other.rows > one.rows ? other : one;
}

/** The separators under which most lines are rows of numbers; null where no line is. */
export function chooseSeparators(notebook: Notebook, lines: TextLines): Separators | null {
  const sample = sampleOf(lines);
  const scores = separatorChoices.map((separators) => scoreOf(lines, sample, separators));
  const best = scores.reduce(better);
  if (best.rows === 0) return null;
  if (isOneDecimalColumn(lines, sample, best)) {
    notebook.transcription.decimalMark = ',';
    decide(notebook, 'delimiter', 'one value a line');
    decide(notebook, 'decimalMark', 'every line is one signed number with a comma');
    return { delimiter: ';', decimalMark: ',' };
  }
  refuseSharedComma(notebook, lines, sample, best);
  const chosen = askThousands(notebook, lines, sample, best.separators);
  notebook.transcription.delimiter = best.columns === 1 ? null : delimiterNames[chosen.delimiter];
  notebook.transcription.decimalMark = chosen.decimalMark;
  decide(notebook, 'delimiter', best.columns === 1 ? 'one value a line' : `${best.rows} of ${sample.length} lines looked at are rows of ${best.columns} columns this way`);
  return chosen;
}

/** Whether what seem to be two columns of whole numbers is one of levels with decimal comma: what stands first is negative, and what stands second never signed. */
function isOneDecimalColumn(lines: TextLines, sample: readonly number[], { separators, columns }: Score): boolean {
  if (separators.delimiter !== ',' || columns !== 2) return false;
  const rows = sample.map((line) => lineAt(lines, line).trim()).filter((text) => readRow(text, separators)?.length === 2);
  return rows.every((text) => /^[+\-\u2212]?\d+,\d+$/.test(text)) && rows.some((text) => /^[-\u2212]/.test(text));
}

/** A comma that may both part columns and mark decimals: whole numbers alone in an even number of columns, with names for half of them. */
function refuseSharedComma(notebook: Notebook, lines: TextLines, sample: readonly number[], { separators, columns }: Score): void {
  if (separators.delimiter !== ',' || columns < 3) return;
  const rows = sample.map((line) => ({ line, cells: splitCells(lineAt(lines, line), ',') })).filter(({ line, cells }) => cells.length === columns && readRow(lineAt(lines, line), separators) !== null);
  const isWhole = rows.every(({ cells }) => cells.every((cell) => /^\s*[+\-\u2212]?\d+\s*$/.test(cell)) && cells.every((cell, at) => at % 2 === 0 || /^\s*\d{1,6}\s*$/.test(cell)));
  if (!isWhole || columns % 2 !== 0 || rows.length < 2) return;
  const [first, second, third] = rows;
  const header = splitCells(lineAt(lines, (first?.line ?? 1) - 1), ',');
  if (header.length === columns && header.every((cell) => /\p{L}/u.test(cell))) return;
  const joined = (cells: readonly string[] = []): string => cells.reduce((text, cell, at) => text + (at === 0 ? '' : at % 2 === 1 ? '.' : '  ') + cell.trim(), '');
  const shown = [first, second, third].flatMap((row) => (row === undefined ? [] : [row]));
  ask(notebook, {
    id: 'decimal-mark', code: 'ambiguous-decimal', message: `Commas may part ${columns} columns, or ${columns / 2} columns of decimal numbers.`, lines: shown.map(({ line }) => line + 1),
    choices: [{ id: 'columns', label: `${columns} columns of whole numbers`, sample: shown.map(({ cells }) => cells.join('  ')).join('\n') }, { id: 'decimals', label: `${columns / 2} columns with decimal comma (save the file with another separator)`, sample: shown.map(({ cells }) => joined(cells)).join('\n') }],
  });
}

const perhapsThousands = /^[+\-\u2212]?\d{1,3},\d{3}$/;

/** A comma that may mark decimals or thousands, where no value of the file decides. */
function askThousands(notebook: Notebook, lines: TextLines, sample: readonly number[], separators: Separators): Separators {
  if (separators.delimiter === ',') return separators;
  const rows = sample.filter((line) => readRow(lineAt(lines, line), separators) !== null);
  const withComma = rows.flatMap((line) => splitCells(lineAt(lines, line), separators.delimiter)).map((cell) => cell.trim()).filter((cell) => cell.includes(','));
  if (withComma.length === 0 || withComma.some((cell) => !perhapsThousands.test(cell))) {
    decide(notebook, 'decimalMark', withComma.length === 0 ? 'no number has a comma' : `commas stand where only ${separators.decimalMark === ',' ? 'a decimal mark' : 'thousands'} can`);
    return separators;
  }
  const shown = rows.slice(0, 3);
  const sampleWith = (change: (text: string) => string): string => shown.map((line) => change(lineAt(lines, line).replaceAll(separators.delimiter, '  '))).join('\n');
  const choice = ask(notebook, {
    id: 'decimal-mark', code: 'ambiguous-decimal', message: 'A comma before three digits may mark decimals or thousands, and no value of the file decides.', lines: shown.map((line) => line + 1),
    choices: [{ id: 'decimal', label: 'decimal comma', sample: sampleWith((text) => text.replaceAll(',', '.')) }, { id: 'thousands', label: 'thousands', sample: sampleWith((text) => text.replaceAll(',', '')) }],
  });
  return { ...separators, decimalMark: choice === 'decimal' ? ',' : '.' };
}
