import { formatFrequency, formatNumber } from '@leeside/units/format-quantity';
import { decibelTicks, type DecibelRange } from './decibel-range';
import { frequencyTicks, type AxisKind, type FrequencyWindow } from './frequency-ticks';
import type { PlotColours } from './plot-colours';
import type { PlotOptions } from './plot-instance';

export interface BaseSettings {
  window: FrequencyWindow;
  axisKind: AxisKind;
  range: DecibelRange;
  unit: string;
  colours: PlotColours;
  width: number;
  locale: string;
  /** Which theme the colours are of. */
  theme: 'light' | 'dark';
}

const face = '12px "Atkinson Hyperlegible Mono", monospace';
const narrowPx = 560;

/** Room right of the plotting area for the names of the series. */
export const endLabelRoomPx = (width: number): number => (width < narrowPx ? 82 : 92);

/** Numbers on the level axis: the topmost carries the unit. */
export const decibelTexts = (ticks: readonly number[], unit: string, locale: string): string[] =>
  ticks.map((tick) => (tick === Math.max(...ticks) ? `${formatNumber(tick, 0, locale)}\u2009${unit}` : formatNumber(tick, 0, locale)));

/** What every plot of the notebook shares: two scales, quiet hairlines, engineer's units, no legend box. */
export function baseOptions({ window, axisKind, range, unit, colours, width, locale }: BaseSettings): Pick<PlotOptions, 'scales' | 'axes' | 'legend' | 'padding' | 'cursor' | 'focus'> {
  const mostTicks = Math.max(3, Math.floor(width / 95));
  return {
    scales: {
      x: { time: false, distr: axisKind === 'log' ? 3 : 1, range: () => [window.fromHz, window.toHz] },
      y: { range: () => [range.least, range.most] },
    },
    legend: { show: false },
    padding: [14, endLabelRoomPx(width), 0, 0],
    cursor: { drag: { x: true, y: false, setScale: false }, points: { show: false }, y: false },
    axes: [
      {
        font: face, stroke: colours.faded, size: 30, gap: 4,
        splits: () => frequencyTicks(window, axisKind, mostTicks),
        filter: (_, splits) => splits,
        values: (_, splits) => splits.map((hz) => formatFrequency(hz, 4, locale)),
        grid: { show: false }, ticks: { stroke: colours.ink, width: 1, size: 6 }, border: { show: true, stroke: colours.ink, width: 1 },
      },
      {
        font: face, stroke: colours.faded, size: width < narrowPx ? 62 : 66, gap: 6,
        splits: () => decibelTicks(range, 6),
        values: (_, splits) => decibelTexts(splits, unit, locale),
        grid: { stroke: colours.rule, width: 1 }, ticks: { show: false },
      },
    ],
  };
}
