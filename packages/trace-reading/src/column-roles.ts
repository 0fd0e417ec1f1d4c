import { columnFacts, type ColumnFacts } from './column-facts.js';
import type { DataBlock } from './data-blocks.js';
import { roleOfName, type Header, type NamedRole } from './header-line.js';
import { ask, decide, doubt, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';
import type { StatedRange } from './stated-range.js';

/** A column that is a trace, or a pair of columns that make one. */
export interface TraceColumn {
  readonly column: number;
  readonly name: string;
  readonly unitText: string;
  /** The other half of a complex value. */
  readonly imaginaryColumn?: number;
  /** A linear magnitude of a ratio, to be shown in dB. */
  readonly isLinearRatio?: boolean;
}

export interface ColumnRoles {
  /** Null where the file gives levels alone. */
  readonly frequencyColumn: number | null;
  readonly traces: readonly TraceColumn[];
}

interface Column {
  readonly place: number;
  readonly name: string;
  readonly unitText: string;
  readonly role: NamedRole;
  readonly facts: ColumnFacts;
}

function columnsOf(block: DataBlock, header: Header | null): Column[] {
  return block.columns.map((numbers, place) => {
    const name = header?.names[place] ?? '';
    const unitText = [header?.units[place] ?? '', block.gluedUnits[place] ?? ''].find((text) => text !== '') ?? '';
    const named = roleOfName(`${name} ${unitText}`.trim());
    return { place, name, unitText, role: name === '' && unitText === '' ? null : named, facts: columnFacts(numbers) };
  });
}

/** Whether a column begins and ends where the preamble says, within two steps. */
function reachesRange(facts: ColumnFacts, rowCount: number, range: StatedRange): boolean {
  const factors = range.unit === null ? [1, 1e3, 1e6, 1e9] : [1, 1e3, 1e6, 1e9];
  return factors.some((factor) => {
    const [low, high] = [Math.min(facts.first, facts.last) * factor, Math.max(facts.first, facts.last) * factor];
    const slack = Math.max((2 * (range.stopHz - range.startHz)) / Math.max(rowCount - 1, 1), 1e-4 * range.stopHz);
    return Math.abs(low - range.startHz) <= slack && (Math.abs(high - range.stopHz) <= slack || (Number.isNaN(range.stopHz) && facts.isAscending));
  });
}

function mayBeFrequency({ facts, role }: Column, rowCount: number): boolean {
  return role === null && facts.lowest >= 0 && (facts.isAscending || facts.isDescending || (facts.risingShare > 0.95 && rowCount > 20));
}

/** The column that its numbers alone show to be the frequency, with the words why; null where none or several may be. */
function shownByNumbers(columns: readonly Column[], rowCount: number, range: StatedRange | null): { column: Column; how: string } | null {
  const reaching = range === null ? [] : columns.filter(({ facts }) => reachesRange(facts, rowCount, range));
  if (reaching.length === 1 && reaching[0]) return { column: reaching[0], how: 'its values reach start and stop of the preamble' };
  const [first, ...others] = columns;
  if (first === undefined) return null;
  if (others.length === 0) return { column: first, how: 'the only one whose values rise steadily' };
  const isFirstAlone = first.place === 0 && first.facts.isAscending && others.every(({ facts }) => facts.isDescending);
  return isFirstAlone ? { column: first, how: 'its values rise, those of the others fall' } : null;
}

function byContent(notebook: Notebook, block: DataBlock, columns: readonly Column[], range: StatedRange | null): Column | null {
  const mayBe = columns.filter((column) => mayBeFrequency(column, block.rowCount) && (!column.facts.isIndex || (range !== null && reachesRange(column.facts, block.rowCount, range))));
  const shown = shownByNumbers(mayBe, block.rowCount, range);
  if (shown !== null) decide(notebook, 'frequencyColumn', `column ${shown.column.place + 1}: ${shown.how}`);
  if (shown !== null || mayBe.length === 0) return shown === null ? null : shown.column;
  return askColumn(notebook, block, mayBe);
}

function askColumn(notebook: Notebook, block: DataBlock, columns: readonly Column[]): Column {
  const sample = (column: Column): string => [0, 1, 2].map((row) => String(block.columns[column.place]?.[row] ?? '')).join('\n');
  const choice = ask(notebook, {
    id: 'frequency-column', code: 'needs-mapping', message: 'More than one column may be the frequency.', lines: [block.firstLine + 1],
    choices: columns.map((column) => ({ id: `column-${column.place + 1}`, label: `column ${column.place + 1}`, sample: sample(column) })),
  });
  return columns.find((column) => `column-${column.place + 1}` === choice) ?? (columns[0] as Column);
}

function frequencyOf(notebook: Notebook, block: DataBlock, columns: readonly Column[], range: StatedRange | null): Column | null {
  const named = columns.filter(({ role, facts }) => role === 'frequency' && !facts.isEmpty && !(facts.isConstant && block.rowCount > 1));
  if (named[0]) {
    decide(notebook, 'frequencyColumn', `column ${named[0].place + 1}: its name "${named[0].name || named[0].unitText}"`);
    return named[0];
  }
  if (columns.some(({ role, facts }) => role === 'time' && !facts.isEmpty)) throw refuse('zero-span', 'The levels stand over time, not over frequency: a zero-span sweep cannot be paired.', block.firstLine + 1);
  return columns.length === 1 ? null : byContent(notebook, block, columns, range);
}

function isRealPart(column: Column): boolean {
  return /\b(?:re|real|realteil|reel|reelle)\b|\(re\)|_re\b|\.re\b/i.test(column.name);
}
function isImaginaryPart(column: Column): boolean {
  return /\b(?:im|imag|imaginary|imaginarteil|imagin\u00e4rteil|imaginaire)\b|\(im\)|_im\b|\.im\b/i.test(column.name);
}

function traceOf(column: Column, position: number): TraceColumn {
  const isLinear = /\blin\b|linear|\blin mag|lineaire/i.test(column.name) && column.unitText === '';
  return { column: column.place, name: column.name.trim() === '' ? `Trace ${position + 1}` : column.name.trim(), unitText: `${column.name} ${column.unitText}`.trim(), ...(isLinear ? { isLinearRatio: true } : {}) };
}

/** Columns of levels: neither index, time, phase nor limit; those without any value, or zero throughout beside others, are none. */
function tracesOf(notebook: Notebook, columns: readonly Column[]): TraceColumn[] {
  const levels = columns.filter(({ role, facts }) => (role === null || role === 'level') && !facts.isEmpty);
  const filled = levels.filter(({ facts }) => !(facts.isConstant && (facts.first === 0 || facts.first <= -199)));
  const kept = filled.length > 0 ? filled : levels.slice(0, 1);
  const passedOver = columns.filter(({ place }) => !kept.some((column) => column.place === place));
  if (passedOver.length > 0) decide(notebook, 'columnsPassedOver', passedOver.map(({ place, name, role }) => `column ${place + 1}${name === '' ? '' : ` "${name}"`}: ${role ?? 'no values'}`).join('; '));
  const traces: TraceColumn[] = [];
  for (let at = 0; at < kept.length; at += 1) {
    const [column, next] = [kept[at] as Column, kept[at + 1]];
    if (next !== undefined && isRealPart(column) && isImaginaryPart(next)) {
      traces.push({ ...traceOf(column, traces.length), imaginaryColumn: next.place, unitText: '' });
      at += 1;
    } else traces.push(traceOf(column, traces.length));
  }
  return uniqueNames(notebook, traces);
}

function uniqueNames(notebook: Notebook, traces: readonly TraceColumn[]): TraceColumn[] {
  const seen = new Map<string, number>();
  return traces.map((trace) => {
    const times = (seen.get(trace.name) ?? 0) + 1;
    seen.set(trace.name, times);
    if (times === 1) return trace;
    doubt(notebook, { code: 'same-name-twice', weight: 'note', message: `Two traces are named "${trace.name}"; the later one is shown with a number.` });
    return { ...trace, name: `${trace.name} (${times})` };
  });
}

/**
 * What each column is: by its name, else by what its numbers show. Row numbers are no frequencies; empty, zero and sentinel columns no
 * traces.
 * @param notebook where it is written by what each was decided.
 * @param block the rows.
 * @param header names and units, null where the file has none.
 * @param range start and stop as the preamble states them.
 */
export function decideColumns(notebook: Notebook, block: DataBlock, header: Header | null, range: StatedRange | null): ColumnRoles {
  const columns = columnsOf(block, header);
  const frequency = frequencyOf(notebook, block, columns, range);
  const others = columns.filter((column) => column !== frequency && !(column.facts.isIndex && column.role === null && columns.length > 1) && column.role !== 'index');
  const traces = tracesOf(notebook, others.filter((column) => column.role !== 'frequency'));
  if (traces.length === 0) throw refuse('no-data', 'No column holds levels.', block.firstLine + 1);
  decide(notebook, 'levelColumns', traces.map((trace) => `column ${trace.column + 1} "${trace.name}"`).join(', '));
  return { frequencyColumn: frequency?.place ?? null, traces };
}
