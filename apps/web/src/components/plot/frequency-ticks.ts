import { log10Of, powerOfTen } from '@leeside/units/logarithm';

export type AxisKind = 'log' | 'linear';
export interface FrequencyWindow { fromHz: number; toHz: number }

const roundSteps = [1, 2, 5, 10];

const tidy = (value: number): number => Number(value.toPrecision(12));

function evenTicks({ fromHz, toHz }: FrequencyWindow, most: number): number[] {
  const raw = (toHz - fromHz) / Math.max(1, most);
  const decade = powerOfTen(Math.floor(log10Of(raw)));
  const step = tidy((roundSteps.find((multiple) => multiple * decade >= raw) ?? 10) * decade);
  const first = Math.ceil(fromHz / step);
  const last = Math.floor(toHz / step);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, at) => tidy((first + at) * step));
}

function decadeTicks({ fromHz, toHz }: FrequencyWindow, multiples: readonly number[]): number[] {
  const firstDecade = Math.floor(log10Of(fromHz));
  const lastDecade = Math.ceil(log10Of(toHz));
  const decades = Array.from({ length: lastDecade - firstDecade + 1 }, (_, at) => powerOfTen(firstDecade + at));
  return decades.flatMap((decade) => multiples.map((multiple) => tidy(multiple * decade))).filter((hz) => hz >= fromHz && hz <= toHz);
}

/** Where a frequency axis carries a number: 1-2-5 in every decade, sparser or finer as the window asks. */
export function frequencyTicks(window: FrequencyWindow, kind: AxisKind, most: number): number[] {
  if (kind === 'linear') return evenTicks(window, most);
  const full = decadeTicks(window, [1, 2, 5]);
  if (full.length < 3) return evenTicks(window, Math.min(most, 6));
  if (full.length <= most) return full;
  const decades = decadeTicks(window, [1]);
  return decades.length >= 2 ? decades : full.filter((_, at) => at % Math.ceil(full.length / most) === 0);
}
