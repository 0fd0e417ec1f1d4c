import { decibelsFromPowerRatio } from '@leeside/units/decibels';

/** An analyzer's own noise. */
export interface Receiver {
  readonly noiseFigureDb: number;
  readonly inputAttenuationDb: number;
  /** How much more noise at the top of a 6 GHz band than at the bottom, dB. */
  readonly noiseSlopeDbPerSixGigahertz: number;
}

const boltzmannJPerK = 1.380649e-23;
const roomTemperatureK = 290;

/**
 * Mean noise power in the RBW, 10·log10(kTB) + noise figure + input attenuation.
 * @param rbwHz noise bandwidth, Hz.
 * @param frequencyHz where, Hz.
 * @returns dBm at each frequency.
 */
export function meanNoiseDbm(receiver: Receiver, rbwHz: number, frequencyHz: Float64Array): Float64Array {
  const thermalDbm = decibelsFromPowerRatio(boltzmannJPerK * roomTemperatureK * rbwHz * 1000);
  return frequencyHz.map((atHz) => thermalDbm + receiver.noiseFigureDb + receiver.inputAttenuationDb
    + (receiver.noiseSlopeDbPerSixGigahertz * atHz) / 6e9);
}
