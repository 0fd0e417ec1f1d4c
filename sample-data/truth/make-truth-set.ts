import { carrierResponseDbm } from '../physics/carrier-response.js';
import { frequencyAxisHz } from '../physics/frequency-axis.js';
import { randomSource } from '../physics/random-source.js';
import { spreadLevels, swingingLevels, withWeakReference, type TruthLevels } from './truth-levels.js';
import type { TruthFile, TruthOptions, TruthSet } from './truth-set.js';
import { truthSweepFile } from './truth-sweep-file.js';

/** The generator drifts by this much between the opening and the closing reference; the enclosed sweep stands in the middle. */
const driftDb = 0.6;
const wholeBand: Band = { startHz: 3e7, stopHz: 6e9, label: '', order: 0 };
const spotCarriers = 24;

/** What one group of sweeps covers. */
interface Band {
  readonly startHz: number;
  readonly stopHz: number;
  /** Goes into the file names. */
  readonly label: string;
  readonly order: number;
}

/** What arrives on an axis in the open and inside, and the noise. */
interface Arriving {
  readonly openDbm: Float64Array;
  readonly insideDbm: Float64Array;
  readonly noiseDbm: Float64Array;
}

const planned = [
  { name: 'reference-opening', role: 'reference', shiftDb: -driftDb / 2, minute: 0 },
  { name: 'noise-generator-off', role: 'noise', shiftDb: 0, minute: 40 },
  { name: 'enclosed', role: 'enclosed', shiftDb: 0, minute: 80 },
  { name: 'reference-closing', role: 'reference', shiftDb: driftDb / 2, minute: 120 },
] as const;

function signalOf(role: TruthFile['role'], arriving: Arriving, shiftDb: number): Float64Array {
  if (role === 'noise') return arriving.noiseDbm.map(() => -Infinity);
  return role === 'enclosed' ? arriving.insideDbm : arriving.openDbm.map((levelDbm) => levelDbm + shiftDb);
}

function filesOf(options: TruthOptions, band: Band, arrivingOn: (axisHz: Float64Array) => Arriving): TruthFile[] {
  return planned
    .filter((sweep) => options.noiseSweep || sweep.role !== 'noise')
    .map(({ name, role, shiftDb, minute }, part) => {
      const axisHz = frequencyAxisHz(band.startHz, band.stopHz, role === 'reference' ? options.referencePoints : options.points);
      const arriving = arrivingOn(axisHz);
      return truthSweepFile(options, {
        name: `${name}${band.label}.csv`, role, axisHz, signalDbm: signalOf(role, arriving, shiftDb), noiseDbm: arriving.noiseDbm,
        minute: minute + band.order, seed: options.seed * 1000 + band.order * 10 + part,
      });
    });
}

/** Carriers through the RBW, and the noise as it is at the next carrier. */
function carriersOn(options: TruthOptions, levels: TruthLevels): (axisHz: Float64Array) => Arriving {
  return (axisHz) => {
    const seen = (levelDbm: Float64Array): Float64Array => carrierResponseDbm({ frequencyHz: levels.frequencyHz, levelDbm }, axisHz, options.rbwHz);
    const noiseDbm = axisHz.map((atHz) => levels.meanNoiseDbm.at(levels.frequencyHz.findIndex((carrierHz) => carrierHz >= atHz)) ?? 0);
    return { openDbm: seen(levels.referenceLevelDbm), insideDbm: seen(levels.enclosedSignalDbm), noiseDbm };
  };
}

function truthOf(options: TruthOptions, levels: TruthLevels, spanHz: number): TruthSet['truth'] {
  const stepHz = spanHz / (Math.min(options.points, options.referencePoints) - 1);
  return {
    ...levels, style: options.style,
    toleranceHz: options.style === 'continuous' ? 0.6 * stepHz : Math.max(options.rbwHz, 2 * stepHz) + stepHz,
    heldLooks: options.combined === 'held' ? options.looks.enclosed : 1,
    floorKnown: options.noiseSweep || options.style !== 'continuous',
  };
}

function continuousSet(options: TruthOptions): TruthSet {
  const levelsOn = (axisHz: Float64Array): TruthLevels => withWeakReference(swingingLevels(axisHz, options.rbwHz));
  const files = filesOf(options, wholeBand, (axisHz) => {
    const levels = levelsOn(axisHz);
    return { openDbm: levels.referenceLevelDbm, insideDbm: levels.enclosedSignalDbm, noiseDbm: levels.meanNoiseDbm };
  });
  const { startHz, stopHz } = wholeBand;
  return { files, truth: truthOf(options, levelsOn(frequencyAxisHz(startHz, stopHz, options.points)), stopHz - startHz) };
}

function combSet(options: TruthOptions): TruthSet {
  const { startHz, stopHz } = wholeBand;
  const stepHz = (stopHz - startHz) / (options.points - 1);
  const count = Math.floor((options.points - 1) / options.combSpacingBins);
  const carriersHz = Float64Array.from({ length: count }, (_, carrier) => Math.round(startHz + (options.combSpacingBins * (carrier + 0.5) + 0.3) * stepHz));
  const levels = spreadLevels(carriersHz, options.rbwHz, randomSource(options.seed));
  return { files: filesOf(options, wholeBand, carriersOn(options, levels)), truth: truthOf(options, levels, stopHz - startHz) };
}

/** The levels of one carrier of many. */
const oneOf = (levels: TruthLevels, at: number): TruthLevels => ({
  frequencyHz: levels.frequencyHz.slice(at, at + 1), trueAttenuationDb: levels.trueAttenuationDb.slice(at, at + 1),
  referenceLevelDbm: levels.referenceLevelDbm.slice(at, at + 1), enclosedSignalDbm: levels.enclosedSignalDbm.slice(at, at + 1),
  meanNoiseDbm: levels.meanNoiseDbm.slice(at, at + 1),
});

function spotSet(options: TruthOptions): TruthSet {
  const carriersHz = Float64Array.from({ length: spotCarriers }, (_, carrier) => Math.round(4e7 * (5.5e9 / 4e7) ** (carrier / (spotCarriers - 1))));
  const levels = spreadLevels(carriersHz, options.rbwHz, randomSource(options.seed));
  const spanHz = options.spotSpanInRbw * options.rbwHz;
  const files = Array.from(carriersHz).flatMap((carrierHz, order) => {
    const band = { startHz: carrierHz - spanHz / 2, stopHz: carrierHz + spanHz / 2, label: `-${(carrierHz / 1e6).toFixed(3)}MHz`, order };
    return filesOf(options, band, carriersOn(options, oneOf(levels, order)));
  });
  return { files, truth: truthOf(options, levels, spanHz) };
}

const makers = { continuous: continuousSet, comb: combSet, spot: spotSet } as const;

/**
 * A session's files of which everything is known: two references 0.6 dB apart around an enclosed sweep, with or without a noise sweep.
 * @param options style, points, looks, layout and seed; the same options give the same bytes.
 * @returns the files and what is true at each bin (continuous) or carrier (comb, spot).
 */
export function makeTruthSet(options: TruthOptions): TruthSet {
  return makers[options.style](options);
}
