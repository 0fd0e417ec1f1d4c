import { decibelsFromFieldRatio, decibelsFromPowerRatio, powerRatioFromDecibels } from '@leeside/units/decibels';
import { cavityModesHz, lightMPerS, type InsideSizeM } from './cavity-modes.js';

/** How an invented enclosure leaks. */
export interface Enclosure {
  /** What the walls alone would give, dB. */
  readonly plateauDb: number;
  /** Length of the slot that leaks as much as all its seams, folds and pores, m. */
  readonly slotLengthM: number;
  readonly insideSizeM: InsideSizeM;
  /** How far attenuation dips at the first inside resonance, dB; higher ones dip less. */
  readonly dipDb: number;
  /** Q of the inside as the sample's lining leaves it. */
  readonly quality: number;
}

/** Leakage of one slot up to half a wave long, A = 20·log10(λ/2L) dB; 0 above. */
export function slotAttenuationDb(slotLengthM: number, frequencyHz: number): number {
  return Math.max(0, decibelsFromFieldRatio(lightMPerS / frequencyHz / (2 * slotLengthM)));
}

function dipsDb(enclosure: Enclosure, modesHz: readonly number[], frequencyHz: number): number {
  return modesHz.reduce((sumDb, modeHz, order) => {
    const detuning = (2 * enclosure.quality * (frequencyHz - modeHz)) / modeHz;
    return sumDb + enclosure.dipDb / (1 + order / 3) / (1 + detuning * detuning);
  }, 0);
}

/**
 * Attenuation of an invented enclosure along a band: walls and slot leak side by side (powers add), inside resonances dip.
 * @param frequencyHz where, ascending, Hz.
 * @returns dB at each frequency, never below 0.
 */
export function enclosureAttenuationDb(enclosure: Enclosure, frequencyHz: Float64Array): Float64Array {
  const modesHz = cavityModesHz(enclosure.insideSizeM, (frequencyHz.at(-1) ?? 0) * 1.1);
  return frequencyHz.map((atHz) => {
    const leakage = powerRatioFromDecibels(-enclosure.plateauDb)
      + powerRatioFromDecibels(-slotAttenuationDb(enclosure.slotLengthM, atHz));
    return Math.max(0, -decibelsFromPowerRatio(leakage) - dipsDb(enclosure, modesHz, atHz));
  });
}
