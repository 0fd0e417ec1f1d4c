import type { Curve } from '@leeside/contracts/curves';
import { formatFrequency } from '@leeside/units/format-quantity';
import { attenuationInWords } from '../../components/shown-attenuation';

/** A curve in a few sentences, for those who cannot see the plot and those who will not. */
export function curveSummary(curve: Curve, locale: string): string {
  const subject = curve.sampleCode ? `Sample ${curve.sampleCode}` : 'An enclosed sweep without a sample';
  const { lowest } = curve;
  const least = lowest
    ? `The lowest attenuation is ${attenuationInWords(lowest.attenuationDb, lowest.atLeast, locale)} at ${formatFrequency(lowest.frequencyHz, 6, locale)}.`
    : 'It has no number.';
  const outcome = curve.outcome && curve.requirementName ? `Against “${curve.requirementName}” it ${outcomeWords[curve.outcome]}.` : 'It was compared with no requirement.';
  const gaps = curve.gaps.length === 0 ? '' : curve.gaps.length === 1 ? ' One stretch has no number.' : ` ${String(curve.gaps.length)} stretches have no number.`;
  return `${subject}, ${String(curve.pointCount)} ${curve.pointCount === 1 ? 'point' : 'points'}. ${least} ${outcome}${gaps}`;
}

const outcomeWords: Record<NonNullable<Curve['outcome']>, string> = {
  'meets': 'meets it everywhere',
  'falls short': 'falls short',
  'too close to call': 'is too close to call',
  'beyond reach': 'is beyond reach: the ceiling of the set-up is too low to tell',
  'not all measured': 'is not all measured',
};
