import type { CurveInput, MeasuredSweep, TypedLevel } from './curve-input.js';

/** One curve that a session has: a sample in a condition, or an enclosed sweep that belongs to no sample yet. */
export interface SessionCurve {
  readonly sampleId: string | null;
  readonly condition: string;
  readonly subjectTraceId: string | null;
  readonly input: Omit<CurveInput, 'parameters' | 'requirement'>;
}

/**
 * Which curves a session has, and what goes into each: one a sample and condition; an enclosed sweep without a sample has its own.
 * @param traces all traces of the session that are not set aside.
 * @param levels all typed levels of the session.
 */
export function groupCurves(traces: readonly MeasuredSweep[], levels: readonly TypedLevel[]): SessionCurve[] {
  const of = (role: MeasuredSweep['role']): MeasuredSweep[] => traces.filter((trace) => trace.role === role);
  const shared = { references: of('reference'), noises: of('noise'), leakages: of('leakage'), ambients: of('ambient') };
  const sharedLevels = levels.filter((level) => level.role !== 'enclosed');
  const groups = new Map<string, { sampleId: string | null; condition: string; subjectTraceId: string | null; enclosed: MeasuredSweep[]; levels: TypedLevel[] }>();
  const groupOf = (sampleId: string | null, condition: string, subjectTraceId: string | null) => {
    const key = JSON.stringify([sampleId, condition, subjectTraceId]);
    const group = groups.get(key) ?? { sampleId, condition, subjectTraceId, enclosed: [], levels: [] };
    groups.set(key, group);
    return group;
  };
  for (const trace of of('enclosed')) groupOf(trace.sampleId, trace.condition, trace.sampleId === null ? trace.traceId : null).enclosed.push(trace);
  for (const level of levels) if (level.role === 'enclosed') groupOf(level.sampleId, level.condition, null).levels.push(level);
  return [...groups.values()].map(({ enclosed, levels: own, ...key }) => ({ ...key, input: { ...shared, enclosed, levels: own.length === 0 ? [] : [...own, ...sharedLevels] } }));
}
