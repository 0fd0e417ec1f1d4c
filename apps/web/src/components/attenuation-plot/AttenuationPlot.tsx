import type { CurvePointsBody } from '@leeside/contracts/curves';
import { useMemo } from 'react';
import { decibelRange } from '../plot/decibel-range';
import type { AxisKind, FrequencyWindow } from '../plot/frequency-ticks';
import { plotColours } from '../plot/plot-colours';
import { PlotCanvas, type PlotCursor } from '../plot/PlotCanvas';
import { useDarkTheme } from '../plot/use-dark-theme';
import { readerLocale } from '../reader-locale';
import { attenuationColumns } from './attenuation-data';
import { attenuationOptions, attenuationSeriesData } from './attenuation-options';
import { wallTop, type Segment } from './requirement-wall';

export interface PlotView { window: FrequencyWindow; axisKind: AxisKind; width: number; joined: boolean }
export interface PlotHandlers { onCursor: (hz: number) => void; onZoom: (window: FrequencyWindow) => void; onReset: () => void }
interface AttenuationPlotProps {
  points: CurvePointsBody;
  gaps: readonly FrequencyWindow[];
  segments: readonly Segment[];
  view: PlotView;
  cursor: PlotCursor | null;
  handlers: PlotHandlers;
}

/** Attenuation upwards over frequency: shapes what was loaded and hands it to the canvas. */
export function AttenuationPlot({ points, gaps, segments, view, cursor, handlers }: AttenuationPlotProps) {
  const dark = useDarkTheme();
  const columns = useMemo(() => attenuationColumns(points, gaps), [points, gaps]);
  const data = useMemo(() => attenuationSeriesData(columns), [columns]);
  const { window, axisKind, width, joined } = view;
  const options = useMemo(() => {
    const required = segments.flatMap((segment) => wallTop(segment, window) ?? []).map(({ db }) => db);
    const range = decibelRange([points.attenuationDb, points.ceilingDb, columns.upperDb, columns.lowerDb, required], 12, 4);
    return attenuationOptions({ columns, segments, joined, window, axisKind, width, range, colours: plotColours(), locale: readerLocale(), theme: dark ? 'dark' : 'light' });
  }, [columns, points, segments, joined, window, axisKind, width, dark]);
  return <PlotCanvas options={options} columns={data} width={width} height={width < 560 ? 300 : 380} cursor={cursor} {...handlers} />;
}
