import { valueAt } from '@leeside/units/value-at';
import { checkPointCount, checkRange } from './check-counts.js';
import { chooseBlocks } from './choose-blocks.js';
import { chooseSeparators } from './choose-separators.js';
import { decideColumns, type TraceColumn } from './column-roles.js';
import { findDataBlocks, strayUnitRefusal, type DataBlock } from './data-blocks.js';
import { decideFrequencyUnit, decideLevelUnit } from './decide-units.js';
import { axisOfColumn, axisOfRange } from './frequency-axis.js';
import { findHeader, type Header } from './header-line.js';
import { measuredTime } from './measured-time.js';
import { decide, doubt, takeSettings, type Notebook } from './notebook.js';
import { entryOf, readPreamble, type Preamble } from './preamble.js';
import { refuse } from './reading-fault.js';
import { readingLimits } from './reading-limits.js';
import type { Separators } from './separators.js';
import { isZeroSpan, statedRange } from './stated-range.js';
import type { SweepSettings } from './sweep.js';
import { settingsOf, traceModeIn } from './sweep-settings.js';
import { sweepFromPoints } from './sweep-from-points.js';
import type { TextLines } from './text-lines.js';
import { frequencyUnitOf, levelUnitOf, type DeclaredLevelUnit } from './unit-words.js';
import type { ReadSweep } from './transcription.js';

/** Reads a table of rows: separators, blocks, columns, units, axis, sweeps. */
export function readTable(notebook: Notebook, lines: TextLines, impedanceOhm: number): ReadSweep[] {
  const separators = chooseSeparators(notebook, lines);
  const blocks = separators === null ? [] : findDataBlocks(lines, separators);
  if (separators === null || blocks.length === 0) throw refuse('no-data', 'The file holds no row of numbers.');
  const chosen = chooseBlocks(notebook, lines, blocks, separators);
  const sweeps = chosen.flatMap((block, at) => {
    const previous = chosen[at - 1];
    const preamble = readPreamble(lines, previous === undefined ? 0 : previous.lastLine + 1, block.firstLine);
    return readBlock(notebook, { lines, block, separators, preamble: previous === undefined ? preamble : joined(readPreamble(lines, 0, chosen[0]?.firstLine ?? 0), preamble), impedanceOhm });
  });
  if (sweeps.length > readingLimits.sweeps) throw refuse('too-many-traces', `The file holds ${sweeps.length} traces; the limit is ${readingLimits.sweeps}.`);
  return sweeps;
}

/** The file's preamble with what stands right above a later block. */
function joined(first: Preamble, own: Preamble): Preamble {
  return { lines: [...first.lines, ...own.lines], entries: [...first.entries, ...own.entries] };
}

interface BlockToRead {
  readonly lines: TextLines;
  readonly block: DataBlock;
  readonly separators: Separators;
  readonly preamble: Preamble;
  readonly impedanceOhm: number;
}

function readBlock(notebook: Notebook, toRead: BlockToRead): ReadSweep[] {
  const { lines, block, separators, preamble } = toRead;
  if (isZeroSpan(preamble)) throw refuse('zero-span', 'The span is zero: the levels stand over time and cannot be paired.', block.firstLine + 1);
  const settings = settingsOf(preamble);
  takeSettings(notebook, settings);
  const header = findHeader(lines, block, separators);
  const range = statedRange(preamble);
  notebook.transcription.headerLine ??= header === null ? null : header.line + 1;
  notebook.transcription.firstDataLine ??= block.firstLine + 1;
  checkPointCount(notebook, preamble, block.rowCount);
  const roles = decideColumns(notebook, block, header, range);
  const frequencyHz = axisOf(notebook, toRead, roles.frequencyColumn, header);
  if (roles.frequencyColumn !== null) checkRange(notebook, range, frequencyHz, block.firstLine + 1);
  notebook.transcription.rowsKept += block.rowCount;
  const impedanceOhm = settings.impedanceOhm ?? toRead.impedanceOhm;
  return roles.traces.map((trace, place) => readTrace(notebook, toRead, { trace, place, frequencyHz, settings, impedanceOhm, count: roles.traces.length }));
}

function rowsShown(block: DataBlock, frequencyColumn: number | null, levelColumn: number) {
  const rows = [0, Math.floor(block.rowCount / 2), block.rowCount - 1].filter((row, at, all) => row >= 0 && all.indexOf(row) === at);
  const of = (column: number | null): number[] => rows.map((row) => (column === null ? NaN : (block.columns[column]?.[row] ?? NaN)));
  return { lines: rows.map((row) => (block.lines[row] ?? 0) + 1), frequency: of(frequencyColumn), level: of(levelColumn) };
}

/** Everything that may name the unit of a column: its cells, the line of units, its name. */
function headerTextOf(block: DataBlock, header: Header | null, column: number): string {
  const [glued = '', unit = '', name = ''] = [block.gluedUnits[column], header?.units[column], header?.names[column]];
  if (unit !== '') return `${name} ${unit}`;
  return glued !== '' ? glued : name;
}

function axisOf(notebook: Notebook, { block, preamble }: BlockToRead, frequencyColumn: number | null, header: Header | null): Float64Array {
  const range = statedRange(preamble);
  const column = frequencyColumn === null ? undefined : block.columns[frequencyColumn];
  if (frequencyColumn === null || column === undefined) return axisOfRange(notebook, range, preamble, { rowCount: block.rowCount, line: block.firstLine + 1 });
  const finite = column.filter((value) => Number.isFinite(value));
  const values = [valueAt(finite, 0), valueAt(finite, finite.length - 1)];
  const unit = decideFrequencyUnit(notebook, { headerText: headerTextOf(block, header, frequencyColumn), values, preamble, range, rows: { ...rowsShown(block, frequencyColumn, 0), count: block.rowCount } });
  const stray = block.strayUnits.find((one) => one.column === frequencyColumn && frequencyUnitOf(one.unit) !== unit);
  if (stray !== undefined) throw strayUnitRefusal(stray);
  return axisOfColumn(column, unit);
}

interface TraceToRead {
  readonly trace: TraceColumn;
  readonly place: number;
  readonly frequencyHz: Float64Array;
  readonly settings: SweepSettings;
  readonly impedanceOhm: number;
  readonly count: number;
}

function magnitude(real: Float64Array, imaginary: Float64Array): Float64Array {
  return real.map((value, row) => Math.hypot(value, imaginary[row] ?? NaN));
}

function valuesOf(block: DataBlock, { column, imaginaryColumn }: TraceColumn): Float64Array {
  const values = block.columns[column] ?? new Float64Array();
  const imaginary = imaginaryColumn === undefined ? undefined : block.columns[imaginaryColumn];
  return imaginary === undefined ? values : magnitude(values, imaginary);
}

const voltageUnits: readonly string[] = ['V', 'mV', '\u00b5V', 'dB\u00b5V', 'dBmV', 'dBV'];

function unitOfTrace(notebook: Notebook, { block, preamble }: BlockToRead, trace: TraceColumn, level: Float64Array): DeclaredLevelUnit {
  if (trace.imaginaryColumn !== undefined || trace.isLinearRatio === true) {
    notebook.transcription.levelUnit ??= 'dB';
    decide(notebook, 'levelUnit', 'complex or linear values, shown as 20\u00b7log10 of their magnitude');
    return 'dB';
  }
  const finite = level.filter(Number.isFinite).sort();
  const levelAt = (frequency: number): number => valueAt(level, block.columns[0]?.indexOf(frequency) ?? -1);
  const unit = decideLevelUnit(notebook, { unitText: trace.unitText, name: trace.name, preamble, rows: rowsShown(block, null, trace.column), levelAt, middle: valueAt(finite, finite.length >> 1) });
  const stray = block.strayUnits.find((one) => one.column === trace.column && levelUnitOf(one.unit) !== unit);
  if (stray !== undefined) throw strayUnitRefusal(stray);
  return unit;
}

function readTrace(notebook: Notebook, toRead: BlockToRead, { trace, place, frequencyHz, settings, impedanceOhm, count }: TraceToRead): ReadSweep {
  const { block, preamble } = toRead;
  const level = valuesOf(block, trace);
  const unit = unitOfTrace(notebook, toRead, trace, level);
  if (voltageUnits.includes(unit)) doubt(notebook, { code: 'converted-at-impedance', weight: 'note', message: `Levels in ${unit} were converted to dBm at ${impedanceOhm} \u03a9.` });
  const own = ownSettings(preamble, trace, { place, count });
  const { text, iso } = measuredTime(preamble);
  const isLinearRatio = trace.imaginaryColumn !== undefined || trace.isLinearRatio === true;
  const sweep = sweepFromPoints(notebook, { name: trace.name, points: { frequencyHz, level, lines: block.lines }, unit, isLinearRatio, impedanceOhm, settings: { ...settings, ...own } });
  return { name: trace.name, sweep, ...(iso === undefined ? {} : { measuredAt: iso }), ...(text === undefined ? {} : { measuredAtText: text }) };
}

/** Trace mode and detector of one trace among several: by its own cell of the preamble, else by its name. */
function ownSettings(preamble: Preamble, trace: TraceColumn, { place, count }: { place: number; count: number }): SweepSettings {
  const cells = entryOf(preamble, 'traceMode')?.value.split('|') ?? [];
  const cell = count > 1 && cells.length === count ? cells[place] : undefined;
  const mode = traceModeIn(cell ?? '') ?? (/\(|hold|max|min|avg|average|view|clear/i.test(trace.name) ? traceModeIn(trace.name) : undefined);
  return mode === undefined ? {} : { traceMode: mode };
}
