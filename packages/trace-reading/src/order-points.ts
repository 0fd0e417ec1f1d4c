import { valueAt } from '@leeside/units/value-at';
import { ask, doubt, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';

/** Frequencies with the row each came from, before they are known to rise. */
export interface LoosePoints {
  readonly frequencyHz: Float64Array;
  readonly level: Float64Array;
  readonly lines: Uint32Array;
}

function reversed({ frequencyHz, level, lines }: LoosePoints): LoosePoints {
  return { frequencyHz: frequencyHz.slice().reverse(), level: level.slice().reverse(), lines: lines.slice().reverse() };
}

/** First place where the frequency does not rise; -1 where it always does. */
function firstStall(frequencyHz: Float64Array): number {
  for (let at = 1; at < frequencyHz.length; at += 1) if (!(valueAt(frequencyHz, at) > valueAt(frequencyHz, at - 1))) return at;
  return -1;
}

function sorted(points: LoosePoints): LoosePoints {
  const order = Uint32Array.from({ length: points.level.length }, (_, at) => at).sort((one, other) => valueAt(points.frequencyHz, one) - valueAt(points.frequencyHz, other) || one - other);
  return { frequencyHz: Float64Array.from(order, (at) => valueAt(points.frequencyHz, at)), level: Float64Array.from(order, (at) => valueAt(points.level, at)), lines: Uint32Array.from(order, (at) => valueAt(points.lines, at)) };
}

function sampleOf({ frequencyHz, level }: LoosePoints, around: number): string {
  return [around - 1, around, around + 1].filter((at) => at >= 0 && at < level.length).map((at) => `${frequencyHz[at]} Hz  ${level[at]}`).join('\n');
}

function askOrder(notebook: Notebook, points: LoosePoints, stall: number): LoosePoints {
  const line = valueAt(points.lines, stall) + 1;
  const message = `Line ${line}: the frequency falls to ${points.frequencyHz[stall]} Hz after ${points.frequencyHz[stall - 1]} Hz.`;
  const inOrder = sorted(points);
  ask(notebook, { id: 'frequency-order', code: 'not-ascending', message, lines: [line], choices: [{ id: 'sort', label: 'sort the rows by frequency', sample: sampleOf(inOrder, stall) }] });
  return inOrder;
}

const keep = { first: (values: readonly number[]) => valueAt(values, 0), highest: (values: readonly number[]) => Math.max(...values), mean: (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length } as const;

function mergeEqual(points: LoosePoints, how: keyof typeof keep): LoosePoints {
  const groups: number[][] = [];
  points.frequencyHz.forEach((frequency, at) => {
    const group = groups.at(-1);
    if (group !== undefined && points.frequencyHz[valueAt(group, 0)] === frequency) group.push(at);
    else groups.push([at]);
  });
  return {
    frequencyHz: Float64Array.from(groups, ([first]) => valueAt(points.frequencyHz, first ?? 0)), lines: Uint32Array.from(groups, ([first]) => valueAt(points.lines, first ?? 0)),
    level: Float64Array.from(groups, (group) => keep[how](group.map((at) => valueAt(points.level, at)))),
  };
}

/** A frequency that stands twice with the same level says nothing new; with other levels a person must choose. */
function withoutTwins(notebook: Notebook, points: LoosePoints): LoosePoints {
  const twin = firstStall(points.frequencyHz);
  if (twin < 0) return points;
  const isHarmless = points.frequencyHz.every((frequency, at) => at === 0 || frequency !== points.frequencyHz[at - 1] || points.level[at] === points.level[at - 1]);
  const line = valueAt(points.lines, twin) + 1;
  if (isHarmless) doubt(notebook, { code: 'same-point-twice', weight: 'note', message: `A frequency stands twice with the same level, first in line ${line}; one of both was kept.`, line: line });
  const how = isHarmless ? 'first' : ask(notebook, {
    id: 'same-frequency', code: 'duplicate-frequency', message: `Line ${line}: ${points.frequencyHz[twin]} Hz stands twice with different levels.`, lines: [line - 1, line],
    choices: (['first', 'highest', 'mean'] as const).map((id) => ({ id, label: { first: 'keep the first', highest: 'keep the highest', mean: 'keep the mean in dB' }[id], sample: sampleOf(mergeEqual(points, id), twin - 1) })),
  });
  return mergeEqual(points, how);
}

/** Points in rising order: a falling sweep is turned round; anything else out of order is asked. */
export function orderPoints(notebook: Notebook, points: LoosePoints): LoosePoints {
  const count = points.frequencyHz.length;
  const negative = points.frequencyHz.findIndex((frequency) => frequency < 0);
  if (negative >= 0) throw refuse('bad-frequency', `Line ${valueAt(points.lines, negative) + 1}: ${points.frequencyHz[negative]} Hz is no frequency.`, valueAt(points.lines, negative) + 1);
  if (points.frequencyHz.includes(0)) doubt(notebook, { code: 'zero-frequency', weight: 'note', message: 'The sweep begins at 0 Hz; that point has no place on a logarithmic axis.' });
  if (count > 1 && firstStall(points.frequencyHz) === 1 && firstStall(points.frequencyHz.slice().reverse()) < 0) {
    doubt(notebook, { code: 'falling-sweep', weight: 'note', message: 'The frequencies fall; the sweep was turned round.' });
    return reversed(points);
  }
  const fall = points.frequencyHz.findIndex((frequency, at) => at > 0 && frequency < valueAt(points.frequencyHz, at - 1));
  return withoutTwins(notebook, fall < 0 ? points : askOrder(notebook, points, fall));
}
