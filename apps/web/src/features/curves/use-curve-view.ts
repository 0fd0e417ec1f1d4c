import { useSearchParams } from 'react-router-dom';
import type { AxisKind, FrequencyWindow } from '../../components/plot/frequency-ticks';
import { readCurveView, writeCurveView, type RowChoice } from './curve-view-in-address';

export interface CurveView {
  zoom: FrequencyWindow | null;
  axisKind: AxisKind;
  rows: RowChoice;
  setZoom: (zoom: FrequencyWindow | null) => void;
  setAxisKind: (kind: AxisKind) => void;
  setRows: (rows: RowChoice) => void;
}

/** What is looked at stands in the address, so that a link shows the same. */
export function useCurveView(): CurveView {
  const [search, setSearch] = useSearchParams();
  const view = readCurveView(search);
  const set = (change: Partial<typeof view>): void =>
    setSearch((before) => writeCurveView(before, { ...readCurveView(before), ...change }), { replace: true, preventScrollReset: true });
  return { ...view, setZoom: (zoom) => set({ zoom }), setAxisKind: (axisKind) => set({ axisKind }), setRows: (rows) => set({ rows }) };
}
