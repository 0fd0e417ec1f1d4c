import { slotAttenuationDb } from '../physics/enclosure.js';
import type { RandomSource } from '../physics/random-source.js';
import { meanNoiseDbm } from '../physics/receiver-noise.js';
import { openLevelDbm } from '../physics/transmit-chain.js';
import type { Truth } from './truth-set.js';

/** The levels of a truth. */
export type TruthLevels = Pick<Truth, 'frequencyHz' | 'trueAttenuationDb' | 'referenceLevelDbm' | 'enclosedSignalDbm' | 'meanNoiseDbm'>;

const receiver = { noiseFigureDb: 21, inputAttenuationDb: 0, noiseSlopeDbPerSixGigahertz: 4 };
const chain = { cableLossDbAtGigahertz: 4, antennaCornerHz: 4e7, rippleDb: 1, ripplePeriodHz: 2.3e8 };
/** How far the open reference stands over the mean noise before the losses of the chain, dB. */
const openOverNoiseDb = 84;

/** Mean noise and open reference at these frequencies; the set-up is as good in a wide RBW as in a narrow one. */
function openAndNoise(frequencyHz: Float64Array, rbwHz: number): { openDbm: Float64Array; noiseDbm: Float64Array } {
  const noiseDbm = meanNoiseDbm(receiver, rbwHz, frequencyHz);
  const atOneGigahertz = meanNoiseDbm(receiver, rbwHz, Float64Array.of(1e9))[0] ?? 0;
  return { noiseDbm, openDbm: openLevelDbm({ ...chain, levelDbm: atOneGigahertz + openOverNoiseDb }, frequencyHz) };
}

function levelsFrom(frequencyHz: Float64Array, rbwHz: number, attenuationDb: (point: number, openOverNoise: number) => number): TruthLevels {
  const { openDbm, noiseDbm } = openAndNoise(frequencyHz, rbwHz);
  const trueAttenuationDb = frequencyHz.map((_, point) => attenuationDb(point, (openDbm[point] ?? 0) - (noiseDbm[point] ?? 0)));
  const enclosedSignalDbm = openDbm.map((levelDbm, point) => levelDbm - (trueAttenuationDb[point] ?? 0));
  return { frequencyHz, trueAttenuationDb, referenceLevelDbm: openDbm, enclosedSignalDbm, meanNoiseDbm: noiseDbm };
}

/**
 * A slot of 45 µm with a second leak beside it that adds and cancels in turn (±20 dB), so that the enclosed signal passes several times
 * from far above the noise to far below it.
 */
export function swingingLevels(frequencyHz: Float64Array, rbwHz: number): TruthLevels {
  const swingPeriodHz = ((frequencyHz.at(-1) ?? 0) - (frequencyHz[0] ?? 0)) / 5.5;
  return levelsFrom(frequencyHz, rbwHz, (point) => {
    const atHz = frequencyHz[point] ?? 0;
    return Math.max(0, slotAttenuationDb(0.000_045, atHz) + 20 * Math.cos((2 * Math.PI * atHz) / swingPeriodHz));
  });
}

/** A notch in the transmit chain, one part in seventy of the band wide, where the reference itself all but drowns. */
export function withWeakReference(levels: TruthLevels): TruthLevels {
  const startHz = levels.frequencyHz[0] ?? 0;
  const bandHz = (levels.frequencyHz.at(-1) ?? 0) - startHz;
  const lossDb = levels.frequencyHz.map((atHz, point) => {
    const share = (atHz - startHz) / bandHz;
    if (share < 0.6 || share > 0.6 + 1 / 70) return 0;
    return (levels.referenceLevelDbm[point] ?? 0) - (levels.meanNoiseDbm[point] ?? 0) - 6;
  });
  return {
    ...levels,
    referenceLevelDbm: levels.referenceLevelDbm.map((levelDbm, point) => levelDbm - (lossDb[point] ?? 0)),
    enclosedSignalDbm: levels.enclosedSignalDbm.map((levelDbm, point) => levelDbm - (lossDb[point] ?? 0)),
  };
}

/** Signal-to-noise ratios inside spread evenly from −14 to +42 dB over the carriers, in an order that chance decides. */
export function spreadLevels(frequencyHz: Float64Array, rbwHz: number, random: RandomSource): TruthLevels {
  const order = Array.from(frequencyHz, (_, carrier) => ({ carrier, key: random.uniform() })).sort((one, other) => one.key - other.key);
  const overNoiseDb = new Float64Array(frequencyHz.length);
  order.forEach(({ carrier }, rank) => { overNoiseDb[carrier] = -14 + (56 * rank) / Math.max(1, frequencyHz.length - 1); });
  return levelsFrom(frequencyHz, rbwHz, (point, openOverNoise) => openOverNoise - (overNoiseDb[point] ?? 0));
}
