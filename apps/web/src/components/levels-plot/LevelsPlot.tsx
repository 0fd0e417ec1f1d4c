import type { CurveLevelsBody } from '@leeside/contracts/curves';
import { useMemo } from 'react';
import type { PlotHandlers, PlotView } from '../attenuation-plot/AttenuationPlot';
import { decibelRange } from '../plot/decibel-range';
import type { FrequencyWindow } from '../plot/frequency-ticks';
import { plotColours } from '../plot/plot-colours';
import { PlotCanvas, type PlotCursor } from '../plot/PlotCanvas';
import { useDarkTheme } from '../plot/use-dark-theme';
import { readerLocale, shownUnit } from '../reader-locale';
import { levelColumns, levelSeriesData } from './levels-data';
import { levelOptions } from './levels-options';

interface LevelsPlotProps { levels: CurveLevelsBody; gaps: readonly FrequencyWindow[]; view: PlotView; cursor: PlotCursor | null; handlers: PlotHandlers }

/** The levels that the curve above came from. */
export function LevelsPlot({ levels, gaps, view, cursor, handlers }: LevelsPlotProps) {
  const dark = useDarkTheme();
  const columns = useMemo(() => levelColumns(levels, gaps), [levels, gaps]);
  const data = useMemo(() => levelSeriesData(columns), [columns]);
  const { window, axisKind, width, joined } = view;
  const options = useMemo(() => {
    const range = decibelRange([columns.reference, columns.enclosed, columns.floor], 4, 4);
    return levelOptions({ columns, joined, window, axisKind, width, range, unit: shownUnit(levels.levelUnit), colours: plotColours(), locale: readerLocale(), theme: dark ? 'dark' : 'light' });
  }, [columns, levels.levelUnit, joined, window, axisKind, width, dark]);
  return <PlotCanvas options={options} columns={data} width={width} height={width < 560 ? 200 : 230} cursor={cursor} {...handlers} />;
}
