import { decibelsFromPowerRatio } from '@leeside/units/decibels';

/** From the generator to the analyzer's input, with no enclosure in the way. */
export interface TransmitChain {
  /** Level that would arrive without the losses below, dBm. */
  readonly levelDbm: number;
  /** Loss of all cables at 1 GHz, dB; grows with the square root of the frequency. */
  readonly cableLossDbAtGigahertz: number;
  /** Below this the antennas are too short and the level falls by 40 dB a decade, Hz. */
  readonly antennaCornerHz: number;
  /** Standing waves of the room: half of peak to peak, dB. */
  readonly rippleDb: number;
  /** Their period along the frequency axis, Hz. */
  readonly ripplePeriodHz: number;
}

/**
 * The reference level in the open, without noise.
 * @param frequencyHz where, Hz.
 * @returns dBm at each frequency.
 */
export function openLevelDbm(chain: TransmitChain, frequencyHz: Float64Array): Float64Array {
  return frequencyHz.map((atHz) => chain.levelDbm
    - chain.cableLossDbAtGigahertz * Math.sqrt(atHz / 1e9)
    - decibelsFromPowerRatio(1 + (chain.antennaCornerHz / atHz) ** 4)
    + chain.rippleDb * Math.sin((2 * Math.PI * atHz) / chain.ripplePeriodHz));
}
