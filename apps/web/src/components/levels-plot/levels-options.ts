import { baseOptions, type BaseSettings } from '../plot/base-options';
import { drawEndLabels, type ValueLabel } from '../plot/draw-end-labels';
import { lastValue } from '../plot/end-labels';
import type { PlotInstance, PlotOptions } from '../plot/plot-instance';
import type { LevelColumns } from './levels-data';

export interface LevelSettings extends BaseSettings { columns: LevelColumns; joined: boolean }

const noLine = (): null => null;

/** Reference, enclosed and floor by their names at their ends. */
export function levelLabels({ columns, window, colours }: LevelSettings): ValueLabel[] {
  const named: [string, string, (number | null)[]][] = [
    ['reference', colours.ink, columns.reference], ['enclosed', colours.copper, columns.enclosed], ['floor', colours.slate, columns.floor],
  ];
  return named.flatMap(([text, colour, column]) => {
    const value = lastValue(columns.frequencyHz, column, window.toHz);
    return value === null ? [] : [{ text, colour, value }];
  });
}

/** Options of the plot of levels: the same frequency axis as the attenuation above it. */
export function levelOptions(settings: LevelSettings): PlotOptions {
  const { colours, joined } = settings;
  const line = (label: string, stroke: string, dash?: number[]) => ({
    label, stroke, width: 1.6, ...(dash ? { dash } : {}), ...(joined ? {} : { paths: noLine }),
    points: joined ? { show: false } : { show: true, size: 6, fill: stroke, stroke },
  });
  return {
    ...baseOptions(settings),
    series: [{}, line('floor', colours.slate, [2, 3]), line('enclosed', colours.copper), line('reference', colours.ink)],
    hooks: { draw: [(plot: PlotInstance) => drawEndLabels(plot, levelLabels(settings))] },
  };
}
