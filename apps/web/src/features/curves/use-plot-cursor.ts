import type { CurvePointsBody } from '@leeside/contracts/curves';
import { useMemo, useState } from 'react';
import { nearestIndex } from '../../components/plot/frequency-window';
import type { PlotCursor } from '../../components/plot/PlotCanvas';
import { readingAt, type CursorReading } from './cursor-reading';

export interface PlotCursorState { at: number; reading: CursorReading | null; onCurve: PlotCursor | null; beside: PlotCursor | null; moveTo: (hz: number) => void; step: (points: number) => void; toEnd: (end: 'first' | 'last') => void; count: number }

/** The cursor stands on a point of the curve, at the lowest until it is moved; it reads the same on both plots. */
export function usePlotCursor(points: CurvePointsBody, lowestHz: number): PlotCursorState {
  const [hz, setHz] = useState<number | null>(null);
  const at = nearestIndex(points.frequencyHz, hz ?? lowestHz);
  return useMemo(() => {
    const reading = readingAt(points, at);
    return {
      at, reading,
      onCurve: reading && { hz: reading.hz, value: reading.attenuationDb },
      beside: reading && { hz: reading.hz, value: null },
      moveTo: setHz,
      count: points.frequencyHz.length,
      toEnd: (end) => setHz(points.frequencyHz.at(end === 'first' ? 0 : -1) ?? null),
      step: (count) => {
        const next = points.frequencyHz[Math.min(Math.max(at + count, 0), points.frequencyHz.length - 1)];
        if (next !== undefined) setHz(next);
      },
    };
  }, [points, at]);
}
