import { curveFromSweeps } from '@leeside/attenuation/curve-from-sweeps';
import type { MeasuredSweep } from '@leeside/attenuation/curve-input';
import { groupCurves } from '@leeside/attenuation/curves-of-session';
import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
import { describe, expect, it } from 'vitest';
import { demoLabFiles, demoManifest } from '../../sample-data/demo-lab/demo-lab-files.js';
import type { DemoFile, DemoSession } from '../../sample-data/demo-lab/demo-manifest.js';
import { firstSessionFiles } from '../../sample-data/demo-lab/first-session-files.js';

const files = demoLabFiles();

function sweepOf(file: DemoFile, uploadOrder: number): MeasuredSweep {
  const reading = readTraceBytes(files.get(file.path) ?? new Uint8Array(), { fileName: file.path });
  const sweep = reading.kind === 'read' ? reading.sweeps[0]?.sweep : undefined;
  if (sweep === undefined) throw new Error(`${file.path}: ${JSON.stringify(reading)}`);
  return {
    traceId: file.path, role: file.role, sweep, sampleId: file.sampleCode, condition: file.condition ?? '', polarisation: file.polarisation,
    position: file.position, measuredAtMs: Date.parse(file.measuredAt), uploadOrder, chainLossDb: null, transmitLevelDbm: null, pairedWith: null,
  };
}

/** Each curve of a session as "sample, condition: outcome". */
function outcomesOf(session: DemoSession): string[] {
  const requirement = demoManifest.requirements.find(({ key }) => key === session.requirementKey);
  if (requirement === undefined) throw new Error(`No requirement ${session.requirementKey}`);
  const levels = session.levels.map((level, order) => ({ ...level, id: order.toString(), sampleId: level.sampleCode, condition: level.condition ?? '', order }));
  return groupCurves(session.files.map(sweepOf), levels).map(({ sampleId, condition, input }) => {
    const curve = curveFromSweeps({
      ...input, parameters: { floorMarginDb: session.floorMarginDb, driftLimitDb: 3, standsForRatio: requirement.standsForRatio },
      requirement: { ...requirement, id: requirement.key, guardFactor: 1, segments: [...requirement.segments] },
    });
    return `${sampleId ?? ''}, ${condition}: ${curve.kind === 'curve' ? (curve.outcome ?? 'none') : curve.reason}`;
  }).sort();
}

describe('the demo lab', () => {
  it('has files that are read without a question, each as one sweep', () => {
    for (const [path, bytes] of [...files, ...firstSessionFiles()].filter(([name]) => name !== 'manifest.json')) {
      const reading = readTraceBytes(bytes, { fileName: path });
      expect(reading.kind === 'read' ? reading.sweeps.length : reading, path).toBe(1);
    }
  });

  it('shows pouches and bags that meet, a worn seam and a loose roll that fall short', () => {
    const [pouches] = demoManifest.sessions;
    expect(pouches && outcomesOf(pouches)).toEqual([
      'MP24-011, as delivered, folded twice: meets', 'MP24-014, after 500 openings: falls short', 'MP25-003, as delivered, folded twice: meets',
      'SR-102, rolled once: falls short', 'SR-102, rolled three times: meets',
    ]);
  });

  it('shows what a comb cannot say: most is not all measured, the bent clasp falls short', () => {
    const boxes = demoManifest.sessions[1];
    const outcomes = boxes === undefined ? [] : outcomesOf(boxes);
    expect(outcomes).toHaveLength(4);
    expect(outcomes).toContain('TC-007, both clasps shut: not all measured');
    expect(outcomes).toContain('TC-007, checked by eye, both clasps shut: not all measured');
    expect(outcomes).toContain('TC-009, one clasp bent: falls short');
  });
});
