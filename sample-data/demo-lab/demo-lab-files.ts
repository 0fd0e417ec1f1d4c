import type { BenchDay } from './bench-day.js';
import { boxDay, boxLevels } from './box-day.js';
import { demoIntake } from './demo-intake.js';
import type { DemoFile, DemoManifest } from './demo-manifest.js';
import { pouchDay } from './pouch-day.js';
import { sweepBenchDay } from './sweep-bench-day.js';

const filesOf = (day: BenchDay): DemoFile[] => day.sweeps.map((sweep) => ({
  path: sweep.path, role: sweep.role, sampleCode: sweep.onTheBench?.sampleCode ?? null, condition: sweep.onTheBench?.condition ?? null,
  polarisation: 'vertical', position: 'middle of the table', measuredAt: sweep.measuredAt,
}));

/** What the demo lab's loader reads first. */
export const demoManifest: DemoManifest = {
  about: 'An invented lab: designs, lots, samples and two bench days. Made by sample-data/generate.ts; nothing here was measured.',
  ...demoIntake,
  sessions: [
    { key: 'pouches', title: 'Pouches of two lots and a roll-top bag, 30 MHz to 6 GHz', heldOn: '2026-11-17', impedanceOhm: 50,
      requirementKey: 'portable', floorMarginDb: 6, notes: 'Tracking generator, antenna inside the sample, vertical. Invented data.',
      files: filesOf(pouchDay), levels: [] },
    { key: 'boxes', title: 'Clasp boxes on a comb generator', heldOn: '2026-11-24', impedanceOhm: 50,
      requirementKey: 'rule-of-thumb', floorMarginDb: 6, notes: 'A carrier every 60 MHz; four spot levels read by eye. Invented data.',
      files: filesOf(boxDay), levels: boxLevels },
  ],
};

/** Every file of the demo lab below its folder, the manifest among them. */
export function demoLabFiles(): Map<string, Uint8Array> {
  const manifest = new TextEncoder().encode(`${JSON.stringify(demoManifest, null, 2)}\n`);
  return new Map([['manifest.json', manifest], ...sweepBenchDay(pouchDay), ...sweepBenchDay(boxDay)]);
}
