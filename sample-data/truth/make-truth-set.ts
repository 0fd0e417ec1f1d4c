import { carrierResponseDbm } from '../physics/carrier-response.js';
import { frequencyAxisHz } from '../physics/frequency-axis.js';
import { randomSource } from '../physics/random-source.js';
import { spreadLevels, swingingLevels, withWeakReference, type TruthLevels } from './truth-levels.js';
import type { TruthFile, TruthOptions, TruthSet } from './truth-set.js';
import { truthSweepFile } from './truth-sweep-file.js';

/** The generator drifts by this much between the opening and the closing reference; the enclosed sweep stands in the middle. */
const driftDb = 0.6;
const bandHz = [3e7, 6e9] as const;
const spotCarriers = 24;
/** Width of a spot sweep in RBW. */
const spotSpanInRbw = 200;
/** Bins from one carrier of the comb to the next. */
const combSpacingBins = 20;

/** One axis, what arrives on it in the open and inside, and the noise. */
interface Placed {
  readonly label: string;
  readonly axisHz: Float64Array;
  readonly openDbm: Float64Array;
  readonly insideDbm: Float64Array;
  readonly noiseDbm: Float64Array;
}

function filesOn(options: TruthOptions, placed: Placed, order: number): TruthFile[] {
  const { axisHz, noiseDbm, label } = placed;
  const silence = axisHz.map(() => -Infinity);
  const drifted = (shiftDb: number): Float64Array => placed.openDbm.map((levelDbm) => levelDbm + shiftDb);
  const planned = [
    { name: `reference-opening${label}.csv`, role: 'reference', signalDbm: drifted(-driftDb / 2), minute: 0 },
    { name: `noise-generator-off${label}.csv`, role: 'noise', signalDbm: silence, minute: 40 },
    { name: `enclosed${label}.csv`, role: 'enclosed', signalDbm: placed.insideDbm, minute: 80 },
    { name: `reference-closing${label}.csv`, role: 'reference', signalDbm: drifted(driftDb / 2), minute: 120 },
  ] as const;
  return planned
    .filter((sweep) => options.noiseSweep || sweep.role !== 'noise')
    .map((sweep, part) => truthSweepFile(options, { ...sweep, minute: sweep.minute + order, axisHz, noiseDbm, seed: options.seed * 1000 + order * 10 + part }));
}

function placedCarriers(options: TruthOptions, axisHz: Float64Array, levels: TruthLevels, label: string): Placed {
  const seen = (levelDbm: Float64Array): Float64Array => carrierResponseDbm({ frequencyHz: levels.frequencyHz, levelDbm }, axisHz, options.rbwHz);
  const noiseDbm = axisHz.map((atHz) => {
    const next = levels.frequencyHz.findIndex((carrierHz) => carrierHz >= atHz);
    return levels.meanNoiseDbm.at(next) ?? 0;
  });
  return { label, axisHz, openDbm: seen(levels.referenceLevelDbm), insideDbm: seen(levels.enclosedSignalDbm), noiseDbm };
}

function truthOf(options: TruthOptions, levels: TruthLevels, stepHz: number): TruthSet['truth'] {
  return {
    ...levels, style: options.style,
    toleranceHz: options.style === 'continuous' ? 0.6 * stepHz : Math.max(options.rbwHz, 2 * stepHz) + stepHz,
    heldLooks: options.combined === 'held' ? options.looks.enclosed : 1,
    floorKnown: options.noiseSweep || options.style !== 'continuous',
  };
}

function continuousSet(options: TruthOptions): TruthSet {
  const axisHz = frequencyAxisHz(...bandHz, options.points);
  const levels = withWeakReference(swingingLevels(axisHz, options.rbwHz));
  const placed = { label: '', axisHz, openDbm: levels.referenceLevelDbm, insideDbm: levels.enclosedSignalDbm, noiseDbm: levels.meanNoiseDbm };
  return { files: filesOn(options, placed, 0), truth: truthOf(options, levels, (axisHz[1] ?? 0) - (axisHz[0] ?? 0)) };
}

function combSet(options: TruthOptions): TruthSet {
  const axisHz = frequencyAxisHz(...bandHz, options.points);
  const stepHz = (bandHz[1] - bandHz[0]) / (options.points - 1);
  const count = Math.floor((options.points - 1) / combSpacingBins);
  const carriersHz = Float64Array.from({ length: count }, (_, carrier) => Math.round(bandHz[0] + (combSpacingBins * (carrier + 0.5) + 0.3) * stepHz));
  const levels = spreadLevels(carriersHz, options.rbwHz, randomSource(options.seed));
  return { files: filesOn(options, placedCarriers(options, axisHz, levels, ''), 0), truth: truthOf(options, levels, stepHz) };
}

function spotSet(options: TruthOptions): TruthSet {
  const carriersHz = Float64Array.from({ length: spotCarriers }, (_, carrier) => Math.round(4e7 * (5.5e9 / 4e7) ** (carrier / (spotCarriers - 1))));
  const levels = spreadLevels(carriersHz, options.rbwHz, randomSource(options.seed));
  const spanHz = spotSpanInRbw * options.rbwHz;
  const files = Array.from(carriersHz).flatMap((carrierHz, order) => {
    const one: TruthLevels = {
      frequencyHz: levels.frequencyHz.slice(order, order + 1), trueAttenuationDb: levels.trueAttenuationDb.slice(order, order + 1),
      referenceLevelDbm: levels.referenceLevelDbm.slice(order, order + 1), enclosedSignalDbm: levels.enclosedSignalDbm.slice(order, order + 1),
      meanNoiseDbm: levels.meanNoiseDbm.slice(order, order + 1),
    };
    const axisHz = frequencyAxisHz(carrierHz - spanHz / 2, carrierHz + spanHz / 2, options.points);
    return filesOn(options, placedCarriers(options, axisHz, one, `-${(carrierHz / 1e6).toFixed(3)}MHz`), order);
  });
  return { files, truth: truthOf(options, levels, spanHz / (options.points - 1)) };
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
