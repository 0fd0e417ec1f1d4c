import { frequencyHzFrom, hertzPerUnit, type FrequencyUnit } from '@leeside/units/frequency-unit';
import { log10Of, powerOfTen } from '@leeside/units/logarithm';
import { decide, type Notebook } from './notebook.js';
import { entryOf, type Preamble } from './preamble.js';
import { refuse } from './reading-fault.js';
import { statedPoints, type StatedRange } from './stated-range.js';

/** A column of frequencies in hertz. Whole-number factors keep every digit that was written. */
export function axisOfColumn(column: Float64Array, unit: FrequencyUnit): Float64Array {
  return hertzPerUnit[unit] === 1 ? Float64Array.from(column) : column.map((value) => frequencyHzFrom(value, unit));
}

/** An axis that the file does not write out: from start, stop and number of points of the preamble, evenly or by decades. */
export function axisOfRange(notebook: Notebook, range: StatedRange | null, preamble: Preamble, { rowCount, line }: { rowCount: number; line: number }): Float64Array {
  if (range === null || Number.isNaN(range.stopHz)) throw refuse('frequency-missing', 'The rows hold levels alone, and the preamble does not tell start and stop (or centre and span) of the sweep.', line);
  if (range.unit === null && range.stopHz < 1e6) throw refuse('frequency-missing', 'The rows hold levels alone, and start and stop in the preamble have no unit.', line);
  const isLog = /\blog/i.test(entryOf(preamble, 'axisScale')?.value ?? '') && range.startHz > 0;
  const points = statedPoints(preamble);
  decide(notebook, 'frequencyAxis', `${range.how} of the preamble and ${points === null ? 'the number of rows' : 'the stated number of points'}${isLog ? ', in equal steps of log frequency' : ''}`);
  const last = Math.max(1, rowCount - 1);
  const [from, to] = [log10Of(Math.max(range.startHz, 1e-300)), log10Of(range.stopHz)];
  const at = (row: number): number => (isLog ? powerOfTen(from + ((to - from) * row) / last) : range.startHz + ((range.stopHz - range.startHz) * row) / last);
  return Float64Array.from({ length: rowCount }, (_, row) => (row === 0 ? range.startHz : row === last ? range.stopHz : at(row)));
}
