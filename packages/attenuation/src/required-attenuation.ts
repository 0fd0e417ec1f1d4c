import { log10Of } from '@leeside/units/logarithm';
import type { Requirement } from './curve-input.js';

/**
 * Attenuation that a requirement asks for at a frequency: straight in dB over log f within a segment; the higher where two touch.
 * @param requirement chain of segments.
 * @param frequencyHz Hz.
 * @returns dB, NaN where nothing is required.
 */
export function requiredAt(requirement: Requirement, frequencyHz: number): number {
  let required = NaN;
  for (const segment of requirement.segments) {
    if (frequencyHz < segment.fromHz || frequencyHz > segment.toHz) continue;
    const share = (log10Of(frequencyHz) - log10Of(segment.fromHz)) / (log10Of(segment.toHz) - log10Of(segment.fromHz));
    const here = segment.fromDb + share * (segment.toDb - segment.fromDb);
    if (Number.isNaN(required) || here > required) required = here;
  }
  return required;
}
