import { curveFromSweeps } from '@leeside/attenuation/curve-from-sweeps';
import type { MeasuredSweep } from '@leeside/attenuation/curve-input';
import type { CurveResult } from '@leeside/attenuation/curve-result';
import { groupCurves } from '@leeside/attenuation/curves-of-session';
import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
import type { TruthFile } from '../../sample-data/truth/truth-set.js';

function sweepsOf(file: TruthFile, uploadOrder: number): MeasuredSweep[] {
  const reading = readTraceBytes(file.bytes, { fileName: file.name });
  if (reading.kind !== 'read') throw new Error(`${file.name} was not read: ${JSON.stringify(reading)}`);
  return reading.sweeps.map(({ sweep }, trace) => ({
    traceId: `${file.name}#${trace.toString()}`, role: file.role, sweep, sampleId: file.role === 'enclosed' ? 'sample' : null, condition: '',
    polarisation: '', position: '', measuredAtMs: Date.parse(file.measuredAt), uploadOrder, chainLossDb: null, transmitLevelDbm: null, pairedWith: null,
  }));
}

/** From the bytes of a session's files to its only curve, without network or database. */
export function curveOfTruthFiles(files: readonly TruthFile[]): CurveResult {
  const groups = groupCurves(files.flatMap(sweepsOf), []);
  const [group] = groups;
  if (group === undefined || groups.length !== 1) throw new Error(`${groups.length.toString()} curves instead of one`);
  const outcome = curveFromSweeps({ ...group.input, parameters: { floorMarginDb: 6, driftLimitDb: 3, standsForRatio: 1.1 }, requirement: null });
  if (outcome.kind !== 'curve') throw new Error(`No curve: ${outcome.reason}`);
  return outcome;
}
