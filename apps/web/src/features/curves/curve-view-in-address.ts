import type { AxisKind, FrequencyWindow } from '../../components/plot/frequency-ticks';

export const rowChoices = ['all', 'bounds', 'below'] as const;
export type RowChoice = (typeof rowChoices)[number];
export interface CurveViewState { zoom: FrequencyWindow | null; axisKind: AxisKind; rows: RowChoice }

const frequencyOf = (text: string | null): number | null => {
  const hz = Number(text ?? '');
  return Number.isFinite(hz) && hz > 0 ? hz : null;
};

/** Reads a view; whatever is not understood is left at its default. */
export function readCurveView(search: URLSearchParams): CurveViewState {
  const fromHz = frequencyOf(search.get('from'));
  const toHz = frequencyOf(search.get('to'));
  const zoom = fromHz !== null && toHz !== null && fromHz < toHz ? { fromHz, toHz } : null;
  return { zoom, axisKind: search.get('axis') === 'linear' ? 'linear' : 'log', rows: rowChoices.find((choice) => choice === search.get('rows')) ?? 'all' };
}

const tidyHz = (hz: number): string => String(Number(hz.toPrecision(8)));

/** Writes a view beside whatever else the address says; defaults are left out. */
export function writeCurveView(before: URLSearchParams, { zoom, axisKind, rows }: CurveViewState): URLSearchParams {
  const search = new URLSearchParams(before);
  for (const name of ['from', 'to', 'axis', 'rows']) search.delete(name);
  if (zoom) {
    search.set('from', tidyHz(zoom.fromHz));
    search.set('to', tidyHz(zoom.toHz));
  }
  if (axisKind === 'linear') search.set('axis', 'linear');
  if (rows !== 'all') search.set('rows', rows);
  return search;
}
