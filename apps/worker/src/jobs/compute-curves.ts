import { createHash } from 'node:crypto';
import { analysisVersion, curveFromSweeps } from '@leeside/attenuation/curve-from-sweeps';
import type { CurveInput, MeasuredSweep } from '@leeside/attenuation/curve-input';
import type { CurveResult } from '@leeside/attenuation/curve-result';
import { groupCurves, type SessionCurve } from '@leeside/attenuation/curves-of-session';
import type { ComputeCurvesJob } from '@leeside/contracts/jobs';
import { failCurve, keepCurve, listPendingCurves, type PendingCurve } from '@leeside/database/curve-result-store';
import { inTransaction } from '@leeside/database/open-database';
import { readSessionMeasurements, type SessionMeasurements } from '@leeside/database/session-measurements';
import { readProgress } from '@leeside/database/session-store';
import { readSweeps } from '@leeside/database/sweep-store';
import { markSampleMeasured } from '@leeside/database/sample-store';
import { setTraceStyles, type KeptTrace } from '@leeside/database/trace-store';
import type { WorkerTools } from '../worker-tools.js';

const keyOf = (curve: Pick<SessionCurve, 'sampleId' | 'subjectTraceId' | 'condition'>): string => JSON.stringify([curve.sampleId, curve.subjectTraceId, curve.condition]);

/** Computes every pending curve of a session; a curve that is marked anew meanwhile is left to the next job. */
export async function computeCurves(tools: WorkerTools, job: ComputeCurvesJob): Promise<void> {
  const pending = await listPendingCurves(tools.db, job.labId, job.sessionId);
  if (pending.length === 0) return;
  const measurements = await readSessionMeasurements(tools.db, job.labId, job.sessionId);
  if (measurements === null) return;
  const curves = new Map((await groupSession(tools, job, measurements)).map((curve) => [keyOf(curve), curve]));
  for (const one of pending) {
    if (tools.isStopping()) return;
    const curve = curves.get(keyOf(one));
    const state = curve === undefined ? null : await computeOne(tools, job, measurements, { pending: one, curve });
    if (state !== null) await tools.publish(job.sessionId, { kind: 'curve', id: one.id, state });
    await new Promise((resolve) => setImmediate(resolve));
  }
  const progress = await readProgress(tools.db, job.sessionId);
  if (progress) await tools.publish(job.sessionId, { kind: 'progress', progress });
}

async function groupSession(tools: WorkerTools, job: ComputeCurvesJob, measurements: SessionMeasurements): Promise<SessionCurve[]> {
  const withRole = measurements.traces.filter((trace) => trace.role !== null);
  const sweeps = await readSweeps(tools.db, job.labId, withRole.map((trace) => trace.id));
  const measured = withRole.flatMap((trace) => measuredSweep(trace, sweeps.get(trace.id)));
  return groupCurves(measured, measurements.levels.map((level) => ({ ...level })));
}

function measuredSweep(trace: KeptTrace, columns: { frequencyHz: Float64Array; level: Float32Array } | undefined): MeasuredSweep[] {
  if (trace.role === null || columns === undefined) return [];
  const { role, sampleId, condition, polarisation, position, chainLossDb, transmitLevelDbm, pairedWith, uploadOrder } = trace;
  const settings = Object.fromEntries(Object.entries(trace.settings).filter(([, value]) => value !== undefined)) as MeasuredSweep['sweep']['settings'];
  return [{
    traceId: trace.id, role, sampleId, condition, polarisation, position, chainLossDb, transmitLevelDbm, pairedWith, uploadOrder,
    measuredAtMs: trace.measuredAt === null ? null : Date.parse(trace.measuredAt), sweep: { ...columns, levelUnit: trace.levelUnit, settings },
  }];
}

async function computeOne(tools: WorkerTools, job: ComputeCurvesJob, measurements: SessionMeasurements, { pending, curve }: { pending: PendingCurve; curve: SessionCurve }): Promise<'ready' | 'failed' | null> {
  const { requirement } = measurements;
  const parameters = { floorMarginDb: measurements.floorMarginDb, driftLimitDb: measurements.driftLimitDb, standsForRatio: requirement?.standsForRatio ?? 1.1 };
  const input: CurveInput = { ...curve.input, parameters, requirement };
  const result = computeSafely(tools, input, pending);
  const kept = await inTransaction(tools.db, async (trx) => {
    if (result.kind === 'no curve') return failCurve(trx, job.labId, pending, { failure: result.reason, doubts: result.doubts });
    await setTraceStyles(trx, stylesOf(result));
    if (pending.sampleId !== null) await markSampleMeasured(trx, job.labId, pending.sampleId);
    return keepCurve(trx, job.labId, pending, { ...result, inputs: inputsOf(result, measurements), parameters, analysisVersion, inputHash: inputHash(input, measurements) });
  });
  if (!kept) return null;
  return result.kind === 'curve' ? 'ready' : 'failed';
}

function computeSafely(tools: WorkerTools, input: CurveInput, { id }: PendingCurve): ReturnType<typeof curveFromSweeps> {
  try {
    return curveFromSweeps(input);
  } catch (fault) {
    tools.log.error({ fault, curveId: id }, 'the analysis broke');
    return { kind: 'no curve', reason: 'The analysis broke on these sweeps. This is a fault of Leeside, not of the data; the log has the details.', doubts: [] };
  }
}

function stylesOf(result: CurveResult): Map<string, CurveResult['style']> {
  return new Map(result.pairs.flatMap(({ enclosed, reference, closing }) => [enclosed, reference, closing].filter((id) => id !== null && id !== 'typed').map((id) => [id ?? '', result.style] as const)));
}

function inputsOf(result: CurveResult, { files, traces }: SessionMeasurements): { traceId: string; fileId: string; sha256: string; role: string; name: string }[] {
  const roles = new Map(traces.map((trace) => [trace.id, trace.role ?? '']));
  return result.inputs.flatMap((traceId) => {
    const file = files.get(traceId);
    return file === undefined ? [] : [{ traceId, ...file, role: roles.get(traceId) ?? '' }];
  });
}

/** Over everything that the numbers depend on: the same hash means the same bytes. */
function inputHash({ parameters, requirement, levels, ...sweeps }: CurveInput, { files }: SessionMeasurements): string {
  const traces = Object.values(sweeps).flat().map(({ sweep, ...facts }) => ({ ...facts, unit: sweep.levelUnit, settings: sweep.settings, sha256: files.get(facts.traceId)?.sha256 }));
  return createHash('sha256').update(JSON.stringify([analysisVersion, parameters, requirement, levels, traces])).digest('hex');
}
