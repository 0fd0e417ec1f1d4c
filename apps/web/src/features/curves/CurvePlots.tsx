import type { Curve, CurvePointsBody } from '@leeside/contracts/curves';
import { useMemo } from 'react';
import { AttenuationPlot } from '../../components/attenuation-plot/AttenuationPlot';
import { pointsForWidth } from '../../components/attenuation-plot/use-curve-points';
import type { Segment } from '../../components/attenuation-plot/requirement-wall';
import { ErrorState } from '../../components/ErrorState';
import { LevelsPlot } from '../../components/levels-plot/LevelsPlot';
import { useCurveLevels } from '../../components/levels-plot/use-curve-levels';
import type { FrequencyWindow } from '../../components/plot/frequency-ticks';
import { followWindow, zoomWindow } from '../../components/plot/frequency-window';
import { readerLocale } from '../../components/reader-locale';
import { readingAloud } from './cursor-reading';
import { CursorReadout } from './CursorReadout';
import { curveSummary } from './curve-summary';
import { PlotKeys, type PlotActions } from './PlotKeys';
import { PlotTools } from './PlotTools';
import type { CurveView } from './use-curve-view';
import type { PlotCursorState } from './use-plot-cursor';

interface CurvePlotsProps { curve: Curve; points: CurvePointsBody; segments: readonly Segment[]; whole: FrequencyWindow; view: CurveView; cursor: PlotCursorState; width: number }

function usePlotActions({ curve, whole, view, cursor }: CurvePlotsProps): PlotActions {
  const window = view.zoom ?? whole;
  const toLowest = (): void => {
    if (!curve.lowest) return;
    cursor.moveTo(curve.lowest.frequencyHz);
    if (view.zoom) view.setZoom(followWindow(view.zoom, whole, curve.lowest.frequencyHz, view.axisKind));
  };
  const zoom = (factor: number): void => {
    const next = zoomWindow(window, whole, { aboutHz: cursor.reading?.hz ?? window.fromHz, factor, kind: view.axisKind });
    view.setZoom(next.fromHz === whole.fromHz && next.toHz === whole.toHz ? null : next);
  };
  return {
    step: cursor.step, zoom, toLowest, toEnd: cursor.toEnd, reset: () => view.setZoom(null),
  };
}

/** The curve, and beneath it on the same axis the levels that it came from. */
export function CurvePlots(props: CurvePlotsProps) {
  const { curve, points, segments, whole, view, cursor, width } = props;
  const levels = useCurveLevels(curve.id, view.zoom, pointsForWidth(width));
  const actions = usePlotActions(props);
  const { setZoom } = view;
  const joined = curve.style === 'continuous';
  const plotView = useMemo(() => ({ window: view.zoom ?? whole, axisKind: view.axisKind, width, joined }), [view.zoom, whole, view.axisKind, width, joined]);
  const handlers = { onCursor: cursor.moveTo, onZoom: setZoom, onReset: () => setZoom(null) };
  const aloud = cursor.reading ? readingAloud(cursor.reading, readerLocale()) : 'No point here.';
  return (
    <>
      <div className="mb-2 flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        <CursorReadout reading={cursor.reading} />
        <PlotTools axisKind={view.axisKind} zoomed={view.zoom !== null} onAxisKind={view.setAxisKind} onZoom={actions.zoom} onReset={actions.reset} onLowest={actions.toLowest} />
      </div>
      <PlotKeys at={cursor.at} count={cursor.count} aloud={aloud} summary={curveSummary(curve, readerLocale())} actions={actions}>
        <AttenuationPlot points={points} gaps={curve.gaps} segments={segments} view={plotView} cursor={cursor.onCurve} handlers={handlers} />
        <p className="mt-3 mb-1 border-t border-rule pt-2 text-xs text-faded">The levels that it came from</p>
        {levels.data ? <LevelsPlot levels={levels.data} gaps={curve.gaps} view={plotView} cursor={cursor.beside} handlers={handlers} /> : <div className="h-[230px]" />}
      </PlotKeys>
      {levels.isError && <ErrorState error={levels.error} what="The levels beneath could not be loaded" onRetry={() => void levels.refetch()} />}
    </>
  );
}
