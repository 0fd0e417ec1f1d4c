import { baseOptions, type BaseSettings } from '../plot/base-options';
import { drawEndLabels, type ValueLabel } from '../plot/draw-end-labels';
import { lastValue } from '../plot/end-labels';
import type { PlotColumns, PlotInstance, PlotOptions, PlotSeries } from '../plot/plot-instance';
import type { AttenuationColumns } from './attenuation-data';
import { drawCeilingTicks, drawChevrons, drawWash } from './draw-bounds';
import { drawUncertainty } from './draw-uncertainty';
import { drawWall } from './draw-wall';
import { nameOfWall, type Segment } from './requirement-wall';

export interface AttenuationSettings extends Omit<BaseSettings, 'unit'> {
  columns: AttenuationColumns;
  segments: readonly Segment[];
  /** Whether readings stand close enough to be joined; sparse ones never are. */
  joined: boolean;
}

const noLine = (): null => null;

/** The columns in the order of the series below. */
export const attenuationSeriesData = (columns: AttenuationColumns): PlotColumns => [
  columns.frequencyHz, columns.ceilingDb, columns.boundDb, columns.exactDb,
];

function attenuationSeries({ colours, joined }: AttenuationSettings): PlotSeries[] {
  const unjoined = joined ? {} : { paths: noLine };
  return [
    {},
    { label: 'ceiling', stroke: colours.edge, width: 1, points: { show: false }, ...unjoined },
    { label: 'at least', stroke: colours.ink, width: 1.4, dash: [5, 4], points: { show: false }, ...unjoined },
    {
      label: 'attenuation', stroke: colours.ink, width: 2, ...unjoined,
      points: joined ? { show: false } : { show: true, size: 7, fill: colours.ink, stroke: colours.ink },
    },
  ];
}

/** The names at the ends of what is drawn, at the value where each ends. */
export function attenuationLabels({ columns, segments, window, colours }: AttenuationSettings): ValueLabel[] {
  const { frequencyHz, exactDb, ownBoundDb, ceilingDb } = columns;
  const shown = ownBoundDb.map((bound, at) => bound ?? exactDb[at] ?? null);
  const wall = nameOfWall(segments, window);
  const labels: [string, string, number | null][] = [
    ['attenuation', colours.ink, lastValue(frequencyHz, shown, window.toHz)],
    ['ceiling', colours.faded, lastValue(frequencyHz, ceilingDb, window.toHz)],
    ['required', colours.faded, wall?.at === 'edge' ? wall.db : null],
  ];
  return labels.flatMap(([text, colour, value]) => (value === null ? [] : [{ text, colour, value }]));
}

/** Options of the attenuation plot: scales, series, and what is drawn by hand under and over them. */
export function attenuationOptions(settings: AttenuationSettings): PlotOptions {
  const { columns, colours, segments, joined } = settings;
  return {
    ...baseOptions({ ...settings, unit: 'dB' }),
    series: attenuationSeries(settings),
    hooks: {
      drawAxes: [(plot: PlotInstance) => {
        drawWall(plot, segments, colours);
        drawWash(plot, columns, { colours, joined });
        drawUncertainty(plot, columns, colours);
      }],
      draw: [(plot: PlotInstance) => {
        if (!joined) drawCeilingTicks(plot, columns, colours);
        drawChevrons(plot, columns, colours);
        drawEndLabels(plot, attenuationLabels(settings));
      }],
    },
  };
}
