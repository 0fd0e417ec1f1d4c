import { valueAt } from '@leeside/units/value-at';
import { decibelsFromFieldRatio } from '@leeside/units/decibels';
import { levelDbmFrom, type KeptLevelUnit } from '@leeside/units/level-unit';
import { ask, doubt, type Notebook } from './notebook.js';
import { orderPoints, type LoosePoints } from './order-points.js';
import { refuse } from './reading-fault.js';
import { makeSweep, type Sweep, type SweepSettings } from './sweep.js';
import type { DeclaredLevelUnit } from './unit-words.js';

/** The unit in which a declared unit is kept. */
function keptUnit(declared: DeclaredLevelUnit): KeptLevelUnit {
  return declared === 'dB' || declared === 'dB\u00b5V/m' ? declared : 'dBm';
}

const isLinear = (unit: DeclaredLevelUnit): boolean => ['V', 'mV', '\u00b5V', 'W', 'mW', '\u00b5W'].includes(unit);

function converter(unit: DeclaredLevelUnit, impedanceOhm: number, isLinearRatio: boolean): (value: number) => number {
  if (isLinearRatio) return decibelsFromFieldRatio;
  return unit === 'dB' || unit === 'dB\u00b5V/m' ? (value) => value : (value) => levelDbmFrom(value, unit, impedanceOhm);
}

const gapSteps = 10;

function noteOddities(notebook: Notebook, { frequencyHz, level }: Sweep, name: string): void {
  if (level.length === 1) doubt(notebook, { code: 'one-point', weight: 'note', message: `"${name}" has only one point: a spot reading.` });
  if (level.length > 2 && level.every((value) => value === level[0])) doubt(notebook, { code: 'all-equal', weight: 'doubt', message: `All values of "${name}" are equal.` });
  if ((frequencyHz.at(-1) ?? 0) > 1e12) doubt(notebook, { code: 'frequency-implausible', weight: 'doubt', message: 'Frequencies reach above 1 THz: the unit may be wrong.' });
  const steps = Array.from({ length: Math.max(0, Math.min(frequencyHz.length - 1, 5000)) }, (_, at) => valueAt(frequencyHz, at + 1) - valueAt(frequencyHz, at));
  const middle = [...steps].sort((one, other) => one - other)[steps.length >> 1] ?? 0;
  const gap = steps.findIndex((step) => step > gapSteps * middle);
  if (steps.length > 10 && gap >= 0 && middle > 0) doubt(notebook, { code: 'wide-step', weight: 'note', message: `There is a gap between ${frequencyHz[gap]} and ${frequencyHz[gap + 1]} Hz.` });
}

/** What a sweep is made of. */
export interface SweepToMake {
  readonly name: string;
  readonly points: LoosePoints;
  readonly unit: DeclaredLevelUnit;
  readonly isLinearRatio?: boolean;
  readonly impedanceOhm: number;
  readonly settings: SweepSettings;
}

const mostMissing = 0.01;

/** Places of the points that have a value; linear values must be above zero. */
function keptPlaces({ points, unit, isLinearRatio = false }: SweepToMake): Uint32Array {
  const needsPositive = isLinear(unit) || isLinearRatio;
  const isKept = (at: number): boolean => Number.isFinite(valueAt(points.level, at)) && Number.isFinite(valueAt(points.frequencyHz, at)) && (!needsPositive || valueAt(points.level, at) > 0);
  return Uint32Array.from(Array.from({ length: points.level.length }, (_, at) => at).filter(isKept));
}

function noteMissing(notebook: Notebook, points: LoosePoints, kept: Uint32Array): void {
  const missing = points.level.length - kept.length;
  if (missing === 0) return;
  const place = kept.findIndex((at, order) => at !== order);
  const line = valueAt(points.lines, place < 0 ? kept.length : place) + 1;
  const message = `${missing} point${missing === 1 ? ' has' : 's have'} no value (first: line ${line}).`;
  const isMany = missing > mostMissing * points.level.length && missing > 1;
  doubt(notebook, { code: 'no-value', weight: isMany ? 'doubt' : 'note', message, line });
  if (isMany) ask(notebook, { id: 'gaps', code: 'many-gaps', message, lines: [line], choices: [{ id: 'leave-out', label: 'leave these points out', sample: `${kept.length} points of ${points.level.length}` }] });
}

/** Makes a sweep: values that the analyzer marked as none become gaps that are said, levels are converted and rounded to float32. */
export function sweepFromPoints(notebook: Notebook, toMake: SweepToMake): Sweep {
  const { name, points, unit, isLinearRatio = false, impedanceOhm, settings } = toMake;
  const convert = converter(unit, impedanceOhm, isLinearRatio);
  const kept = keptPlaces(toMake);
  noteMissing(notebook, points, kept);
  const ordered = orderPoints(notebook, {
    frequencyHz: Float64Array.from(kept, (at) => valueAt(points.frequencyHz, at)), level: Float64Array.from(kept, (at) => convert(valueAt(points.level, at))), lines: Uint32Array.from(kept, (at) => valueAt(points.lines, at)),
  });
  const made = makeSweep({ frequencyHz: ordered.frequencyHz, level: Float32Array.from(ordered.level), levelUnit: keptUnit(unit), settings });
  if (made.kind === 'fault') {
    const { reason, row } = made.fault;
    throw refuse(reason === 'empty' ? 'no-data' : 'bad-number', `"${name}" cannot be a sweep: ${reason} at row ${row + 1}.`, reason === 'empty' ? undefined : valueAt(ordered.lines, row) + 1);
  }
  noteOddities(notebook, made.sweep, name);
  return made.sweep;
}
