import { buildPyramid, isEven, levelForWindow } from './sweep-pyramid.js';
import { keepAxis, restoreAxis, type KeptAxis } from './frequency-axis.js';
import { packFloat32, unpackFloat32 } from './numeric-columns.js';
import type { Database } from './open-database.js';
import { indicesForPixels, indicesInWindow, type Window } from './pixel-columns.js';

export interface SweepColumns {
  readonly frequencyHz: Float64Array;
  readonly level: Float32Array;
}

/** Keeps the numbers of several traces in one statement. */
export async function insertSweeps(db: Database, labId: string, sweeps: readonly ({ traceId: string } & SweepColumns)[]): Promise<void> {
  if (sweeps.length === 0) return;
  await db('sweeps').insert(sweeps.map(({ traceId, frequencyHz, level }) => {
    const axis = keepAxis(frequencyHz);
    const pyramid = buildPyramid(level);
    return {
      trace_id: traceId, lab_id: labId, axis_start_hz: axis.startHz, axis_step_hz: axis.stepHz, frequency_f64: axis.frequencyF64,
      level_f32: packFloat32(level), pyramid_f32: pyramid && packFloat32(pyramid),
    };
  }));
}

interface SweepRow {
  trace_id: string;
  axis_start_hz: number;
  axis_step_hz: number | null;
  frequency_f64: Buffer | null;
  level_f32: Buffer;
}

const axisOf = (row: Omit<SweepRow, 'level_f32' | 'trace_id'>): KeptAxis => ({ startHz: row.axis_start_hz, stepHz: row.axis_step_hz, frequencyF64: row.frequency_f64 });

/** The numbers of several traces, by trace id. */
export async function readSweeps(db: Database, labId: string, traceIds: readonly string[]): Promise<Map<string, SweepColumns>> {
  const rows: SweepRow[] = await db('sweeps').select('trace_id', 'axis_start_hz', 'axis_step_hz', 'frequency_f64', 'level_f32').where({ lab_id: labId }).whereIn('trace_id', [...traceIds]);
  return new Map(rows.map((row) => {
    const level = unpackFloat32(row.level_f32);
    return [row.trace_id, { frequencyHz: restoreAxis(axisOf(row), level.length), level }];
  }));
}

/** The overview of an evenly spaced sweep from its pyramid; null where the points themselves are needed. */
async function readOverview(db: Database, traceId: string, row: { axis_start_hz: number; axis_step_hz: number | null; point_count: number }, window: Window): Promise<SweepColumns | null> {
  const axis = { startHz: row.axis_start_hz, stepHz: row.axis_step_hz };
  if (window.maxPoints === undefined || !isEven(axis)) return null;
  const count = row.point_count;
  const first = Math.min(count, Math.max(0, Math.ceil(((window.fromHz ?? -Infinity) - axis.startHz) / axis.stepHz)));
  const last = Math.max(-1, Math.min(count - 1, Math.floor(((window.toHz ?? Infinity) - axis.startHz) / axis.stepHz)));
  if (last - first + 1 <= window.maxPoints) return null;
  const level = levelForWindow(count, last - first + 1, Math.floor(window.maxPoints / 2));
  if (level === null) return null;
  const fromBin = Math.floor((first * level.bins) / count);
  const toBin = Math.min(level.bins, Math.ceil(((last + 1) * level.bins) / count));
  const cut: { part: Buffer } | undefined = await db('sweeps').where({ trace_id: traceId })
    .select(db.raw('substring(pyramid_f32 from ? for ?) as part', [level.byteOffset + fromBin * 8 + 1, (toBin - fromBin) * 8])).first();
  if (!cut) return null;
  const bins = unpackFloat32(cut.part);
  const frequencyHz = Float64Array.from(bins, (_, at) => {
    const bin = fromBin + (at >> 1);
    const start = Math.floor((bin * count) / level.bins);
    const end = Math.floor(((bin + 1) * count) / level.bins);
    return axis.startHz + axis.stepHz * (at % 2 === 0 ? start : start + (end - start) / 2);
  });
  return thinOverview({ frequencyHz, level: bins }, window.maxPoints);
}

function thinOverview(overview: SweepColumns, maxPoints: number): SweepColumns {
  return choose(overview, indicesForPixels(overview.level, { from: 0, to: overview.level.length }, maxPoints));
}

function choose(columns: SweepColumns, indices: Uint32Array): SweepColumns {
  return { frequencyHz: Float64Array.from(indices, (at) => columns.frequencyHz[at] ?? NaN), level: Float32Array.from(indices, (at) => columns.level[at] ?? NaN) };
}

/** Levels of a trace in a window, as many as the pixels need; null where the lab has no such trace. */
export async function readTracePoints(db: Database, labId: string, traceId: string, window: Window): Promise<SweepColumns | null> {
  const row: { axis_start_hz: number; axis_step_hz: number | null; point_count: number } | undefined = await db('sweeps')
    .join('traces', 'traces.id', 'sweeps.trace_id').where({ 'sweeps.trace_id': traceId, 'sweeps.lab_id': labId }).select('axis_start_hz', 'axis_step_hz', 'point_count').first();
  if (!row) return null;
  const overview = await readOverview(db, traceId, row, window);
  if (overview !== null) return overview;
  const columns = (await readSweeps(db, labId, [traceId])).get(traceId);
  if (!columns) return null;
  return choose(columns, indicesForPixels(columns.level, indicesInWindow(columns.frequencyHz, window), window.maxPoints));
}
