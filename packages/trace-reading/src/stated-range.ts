import { frequencyHzFrom, type FrequencyUnit } from '@leeside/units/frequency-unit';
import { entryOf, type Preamble } from './preamble.js';
import { frequencyValue, leadingNumber } from './quantity.js';
import { frequencyUnitIn } from './unit-words.js';

/** Start, stop and number of points as the preamble states them. */
export interface StatedRange {
  readonly startHz: number;
  readonly stopHz: number;
  /** Null where the preamble gives numbers without a unit. */
  readonly unit: FrequencyUnit | null;
  readonly how: string;
}

function frequency(preamble: Preamble, key: 'start' | 'stop' | 'center' | 'span'): ReturnType<typeof frequencyValue> {
  const entry = entryOf(preamble, key);
  const found = entry === null ? null : frequencyValue(entry.value, entry.keyText);
  const unit = found === null || found.unit !== null ? null : frequencyUnitIn(entryOf(preamble, 'frequencyUnit')?.value ?? '');
  return found === null || unit === null ? found : { ...found, unit, hz: frequencyHzFrom(found.value, unit) };
}

/** The range by start and stop, else by centre and span; null where neither is told. */
export function statedRange(preamble: Preamble): StatedRange | null {
  const [start, stop] = [frequency(preamble, 'start'), frequency(preamble, 'stop')];
  if (start !== null && stop !== null && stop.hz > start.hz) return { startHz: start.hz, stopHz: stop.hz, unit: stop.unit ?? start.unit, how: 'start and stop' };
  const [center, span] = [frequency(preamble, 'center'), frequency(preamble, 'span')];
  if (center !== null && span !== null && span.hz > 0) return { startHz: center.hz - span.hz / 2, stopHz: center.hz + span.hz / 2, unit: span.unit ?? center.unit, how: 'centre and span' };
  if (start !== null) return { startHz: start.hz, stopHz: NaN, unit: start.unit, how: 'start' };
  return null;
}

/** Whether the preamble says that the span is zero. */
export function isZeroSpan(preamble: Preamble): boolean {
  const span = frequency(preamble, 'span');
  const [start, stop] = [frequency(preamble, 'start'), frequency(preamble, 'stop')];
  return span?.hz === 0 || (start !== null && stop !== null && start.hz === stop.hz && start.hz > 0);
}

/** The number of points that the preamble states. */
export function statedPoints(preamble: Preamble): { count: number; line: number } | null {
  const entry = entryOf(preamble, 'points');
  const count = entry === null ? null : (leadingNumber(entry.value)?.value ?? null);
  return entry === null || count === null || !Number.isInteger(count) || count < 1 ? null : { count, line: entry.line };
}
