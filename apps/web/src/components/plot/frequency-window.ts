import type { AxisKind, FrequencyWindow } from './frequency-ticks';

const narrowestRatio = 1.000001;

const along = (kind: AxisKind) =>
  kind === 'log' ? { to: Math.log, back: Math.exp } : { to: (hz: number) => hz, back: (hz: number) => hz };

/** A window inside the whole one, wide enough to show something. */
export function clampWindow(window: FrequencyWindow, whole: FrequencyWindow): FrequencyWindow {
  const fromHz = Math.min(Math.max(Math.min(window.fromHz, window.toHz), whole.fromHz), whole.toHz);
  const toHz = Math.max(Math.min(Math.max(window.fromHz, window.toHz), whole.toHz), whole.fromHz);
  return toHz / fromHz > narrowestRatio ? { fromHz, toHz } : whole;
}

/** Narrows (factor below 1) or widens a window about a frequency, as the axis shows it. */
export function zoomWindow(window: FrequencyWindow, whole: FrequencyWindow, { aboutHz, factor, kind }: { aboutHz: number; factor: number; kind: AxisKind }): FrequencyWindow {
  const { to, back } = along(kind);
  const centre = to(Math.min(Math.max(aboutHz, window.fromHz), window.toHz));
  const from = centre - (centre - to(window.fromHz)) * factor;
  const upTo = centre + (to(window.toHz) - centre) * factor;
  return clampWindow({ fromHz: Math.max(back(from), Number.MIN_VALUE), toHz: back(upTo) }, whole);
}

/** Moves a window so that a frequency lies inside, keeping its width as the axis shows it. */
export function followWindow(window: FrequencyWindow, whole: FrequencyWindow, hz: number, kind: AxisKind): FrequencyWindow {
  if (hz >= window.fromHz && hz <= window.toHz) return window;
  const { to, back } = along(kind);
  const width = to(window.toHz) - to(window.fromHz);
  const from = Math.min(Math.max(to(hz) - width / 2, to(whole.fromHz)), to(whole.toHz) - width);
  return clampWindow({ fromHz: back(from), toHz: back(from + width) }, whole);
}

/** The index of the value nearest to a frequency in ascending frequencies; −1 for none. */
export function nearestIndex(frequencyHz: ArrayLike<number>, hz: number): number {
  let low = 0;
  let high = frequencyHz.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((frequencyHz[middle] ?? 0) <= hz) low = middle;
    else high = middle;
  }
  if (high < 0) return -1;
  const lowHz = frequencyHz[low] ?? 0;
  const highHz = frequencyHz[high] ?? 0;
  return Math.abs(hz - lowHz) <= Math.abs(highHz - hz) ? low : high;
}

const neighbourShare = 0.05;

/** A little more than a window, so that the lines run on to its edges. */
export function widened({ fromHz, toHz }: FrequencyWindow): FrequencyWindow {
  const ratio = (toHz / fromHz) ** neighbourShare;
  return { fromHz: fromHz / ratio, toHz: toHz * ratio };
}
