import type { Doubt } from '@leeside/trace-reading/transcription';
import type { Sweep, SweepSettings } from '@leeside/trace-reading/sweep';
import type { MeasuredSweep } from './curve-input.js';

const setting: readonly { key: keyof SweepSettings; name: string; code: string }[] = [
  { key: 'rbwHz', name: 'RBW', code: 'rbw' }, { key: 'vbwHz', name: 'VBW', code: 'vbw' }, { key: 'detector', name: 'Detector', code: 'detector' },
  { key: 'traceMode', name: 'Trace mode', code: 'trace-mode' }, { key: 'averaging', name: 'Averaging', code: 'averaging' },
  { key: 'held', name: 'Sweeps held', code: 'held' }, { key: 'attenuationDb', name: 'Input attenuation', code: 'attenuation' },
  { key: 'preamplifier', name: 'Preamplifier', code: 'preamplifier' },
];

function textOf(value: string | number | boolean): string {
  if (typeof value === 'boolean') return value ? 'on' : 'off';
  return String(value);
}

/** Settings that are known on both sides and differ, each with both values; what is unknown counts as equal and is noted once. */
export function settingDoubts(reference: MeasuredSweep, enclosed: MeasuredSweep): Doubt[] {
  const [one, other] = [reference.sweep.settings, enclosed.sweep.settings];
  const doubts: Doubt[] = [];
  const unknown: string[] = [];
  for (const { key, name, code } of setting) {
    const [a, b] = [one[key], other[key]];
    if (a === undefined || b === undefined) unknown.push(name);
    else if (a !== b) doubts.push({ code: `${code}-differs`, weight: 'doubt', message: `${name}: ${textOf(a)} in the reference, ${textOf(b)} in the enclosed sweep.` });
  }
  if (unknown.length > 0) doubts.push({ code: 'settings-unknown', weight: 'note', message: `Not told by the files and taken as equal: ${unknown.join(', ')}.` });
  return doubts;
}

const flatTopBins = 3;
const nearReferenceDb = 1;

/** Signs that the analyzer's input was too strong: levels above its reference level, or a flat top right under it. */
export function overloadDoubts({ sweep, role }: MeasuredSweep): Doubt[] {
  const { referenceLevelDbm } = sweep.settings;
  let peak = -Infinity;
  for (const level of sweep.level) if (level > peak) peak = level;
  if (referenceLevelDbm === undefined) return [{ code: 'reference-level-unknown', weight: 'note', message: `The analyzer's reference level is not told for the ${role} sweep: whether it was overloaded cannot be checked.` }];
  if (peak > referenceLevelDbm) return [{ code: 'overload', weight: 'doubt', message: `The ${role} sweep reaches ${peak.toFixed(1)} dBm, above the analyzer's reference level of ${referenceLevelDbm} dBm.` }];
  return peak >= referenceLevelDbm - nearReferenceDb && hasFlatTop(sweep, peak) ? [{ code: 'overload', weight: 'doubt', message: `The ${role} sweep has a flat top at ${peak.toFixed(1)} dBm, right under the reference level of ${referenceLevelDbm} dBm.` }] : [];
}

function hasFlatTop(sweep: Sweep, peak: number): boolean {
  let run = 0;
  for (const level of sweep.level) {
    run = level === peak ? run + 1 : 0;
    if (run >= flatTopBins) return true;
  }
  return false;
}

/** A stepped generator needs max hold: another trace mode may have missed it. */
export function holdDoubts(reference: MeasuredSweep, enclosed: MeasuredSweep, style: 'spot' | 'comb' | 'continuous'): Doubt[] {
  if (style !== 'comb') return [];
  return [reference, enclosed].flatMap(({ role, sweep: { settings: { traceMode } } }): Doubt[] =>
    traceMode === undefined || traceMode === 'max hold' ? [] :
      [{ code: 'not-max-hold', weight: 'doubt', message: `The ${role} sweep of a comb was taken with trace mode "${traceMode}", not max hold: carriers may have been missed.` }]);
}

/** Carriers at 2 to 5 times another, 20 dB or more below it and off the comb's own grid. */
export function harmonicDoubts(carrierHz: readonly number[], levelAt: (frequencyHz: number) => number, toleranceHz: number): Doubt[] {
  if (carrierHz.length < 2) return [];
  const steps = carrierHz.slice(1).map((frequencyHz, at) => frequencyHz - (carrierHz[at] ?? 0)).sort((one, other) => one - other);
  const grid = steps[steps.length >> 1] ?? 0;
  const isOnGrid = (frequencyHz: number): boolean => {
    const turns = (frequencyHz - (carrierHz[0] ?? 0)) / grid;
    return Math.abs(turns - Math.round(turns)) * grid <= 2 * toleranceHz;
  };
  const harmonics = carrierHz.filter((frequencyHz) => !isOnGrid(frequencyHz) && carrierHz.some((base) => {
    const order = Math.round(frequencyHz / base);
    return order >= 2 && order <= 5 && Math.abs(frequencyHz - order * base) <= order * toleranceHz && levelAt(frequencyHz) <= levelAt(base) - 20;
  }));
  if (harmonics.length === 0) return [];
  return [{ code: 'harmonic', weight: 'doubt', message: `${harmonics.length} carrier(s) may be harmonics of another, the first at ${harmonics[0]} Hz; none was left out.` }];
}
