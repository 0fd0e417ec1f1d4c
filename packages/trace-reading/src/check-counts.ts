import { valueAt } from '@leeside/units/value-at';
import { ask, type Notebook } from './notebook.js';
import { statedPoints, type StatedRange } from './stated-range.js';
import type { Preamble } from './preamble.js';

/** The preamble says one number of points, the file has another: a person decides, nothing is trimmed. */
export function checkPointCount(notebook: Notebook, preamble: Preamble, rowCount: number): void {
  const stated = statedPoints(preamble);
  if (stated === null || stated.count === rowCount) return;
  ask(notebook, {
    id: 'point-count', code: 'point-count-mismatch', message: `The preamble says ${stated.count} points, the file has ${rowCount}.`, lines: [stated.line + 1],
    choices: [{ id: 'as-it-is', label: `read the ${rowCount} rows as they are`, sample: `${rowCount} points` }],
  });
}

const slackSteps = 2;

/** The preamble's start and stop are not those of the rows: a person decides. */
export function checkRange(notebook: Notebook, range: StatedRange | null, frequencyHz: Float64Array, line: number): void {
  if (range === null || range.unit === null || Number.isNaN(range.stopHz) || frequencyHz.length < 2) return;
  const ends = [valueAt(frequencyHz, 0), valueAt(frequencyHz, frequencyHz.length - 1)];
  const [first, last] = [Math.min(...ends), Math.max(...ends)];
  const spanHz = range.stopHz - range.startHz;
  const slackHz = Math.max((slackSteps * spanHz) / (frequencyHz.length - 1), 2e-3 * spanHz);
  if (Math.abs(first - range.startHz) <= slackHz && Math.abs(last - range.stopHz) <= slackHz) return;
  ask(notebook, {
    id: 'range', code: 'range-mismatch', message: `The preamble says ${range.startHz} to ${range.stopHz} Hz, the rows run from ${first} to ${last} Hz.`, lines: [line],
    choices: [{ id: 'rows', label: 'the rows are right', sample: `${first} Hz to ${last} Hz` }],
  });
}
