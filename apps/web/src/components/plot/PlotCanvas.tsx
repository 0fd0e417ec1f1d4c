import { useEffect, useEffectEvent, useRef } from 'react';
import uPlot from 'uplot';
import 'uplot/dist/uPlot.min.css';
import type { FrequencyWindow } from './frequency-ticks';
import type { PlotColumns, PlotInstance, PlotOptions } from './plot-instance';

export interface PlotCursor { hz: number; value: number | null }
interface PlotCanvasProps {
  options: PlotOptions;
  columns: PlotColumns;
  width: number;
  height: number;
  cursor: PlotCursor | null;
  onCursor: (hz: number) => void;
  onZoom: (window: FrequencyWindow) => void;
  onReset: () => void;
}

const shortestDragPx = 6;

const showCursor = (plot: PlotInstance, cursor: PlotCursor | null): void => {
  if (!cursor) return;
  const top = cursor.value === null ? -10 : plot.valToPos(cursor.value, 'y');
  plot.setCursor({ left: plot.valToPos(cursor.hz, 'x'), top }, false);
};

const takeSelection = (plot: PlotInstance): FrequencyWindow | null => {
  const { left, width } = plot.select;
  if (width < shortestDragPx) return null;
  plot.setSelect({ left: 0, width: 0, top: 0, height: 0 }, false);
  return { fromHz: plot.posToVal(left, 'x'), toHz: plot.posToVal(left + width, 'x') };
};

/** The only place that draws with uPlot: what it is given, anew whenever that changes. */
export function PlotCanvas({ options, columns, width, height, cursor, onCursor, onZoom, onReset }: PlotCanvasProps) {
  const place = useRef<HTMLDivElement>(null);
  const drawn = useRef<PlotInstance | null>(null);
  const moved = useEffectEvent((plot: PlotInstance) => {
    if (!plot.cursor.event) return;
    const left = plot.cursor.left ?? -1;
    if (left < 0) showCursor(plot, cursor);
    else onCursor(plot.posToVal(left, 'x'));
  });
  const selected = useEffectEvent((plot: PlotInstance) => {
    const window = takeSelection(plot);
    if (window) onZoom(window);
  });
  const reset = useEffectEvent(() => onReset());
  const again = useEffectEvent((plot: PlotInstance) => showCursor(plot, cursor));

  useEffect(() => {
    if (!place.current || width === 0) return undefined;
    const plot = new uPlot({
      ...options, width, height,
      cursor: { ...options.cursor, bind: { dblclick: () => () => { reset(); return null; } } },
      hooks: {
        ...options.hooks,
        setCursor: [(instance) => moved(instance)],
        setSelect: [(instance) => selected(instance)],
        draw: [...(options.hooks?.draw ?? []), (instance) => again(instance)],
      },
    }, columns, place.current);
    drawn.current = plot;
    let gone = false;
    void document.fonts.ready.then(() => { if (!gone) plot.redraw(false, true); });
    return () => {
      gone = true;
      drawn.current = null;
      plot.destroy();
    };
  }, [options, columns, width, height]);

  useEffect(() => {
    if (drawn.current) showCursor(drawn.current, cursor);
  }, [cursor]);

  return <div ref={place} className="plot-canvas" />;
}
