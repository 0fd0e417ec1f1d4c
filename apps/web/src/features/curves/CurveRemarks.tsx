import type { Curve } from '@leeside/contracts/curves';
import { Frequency, FrequencyRange, Level } from '../../components/Figure';
import { DoubtRemarks, Remark, Remarks } from '../../components/Remarks';

const floorWords: Record<string, string> = {
  'noise sweep': 'The floor was taken from a noise sweep of this session.',
  'beside the carriers': 'The floor was taken from the enclosed sweep itself, beside its carriers.',
  'typed': 'The floor is a typed level.',
  'none': 'There is no floor: no ceiling is known, and nothing is called “in the noise”.',
};

/** What was done to get this curve, and what is doubted about it. */
export function CurveRemarks({ curve }: { curve: Curve }) {
  const { floorSource, driftDb, decidedAtHz, notMeasured } = curve;
  return (
    <Remarks about="the curve">
      <DoubtRemarks doubts={curve.doubts} />
      {decidedAtHz !== null && <Remark>The outcome was decided at <Frequency hz={decidedAtHz} />.</Remark>}
      {floorSource && <Remark>{floorWords[floorSource] ?? `Floor: ${floorSource}.`}</Remark>}
      {driftDb !== null && <Remark>Between the opening and the closing reference the set-up moved by <Level level={driftDb} unit="dB" />. Their mean was used.</Remark>}
      {notMeasured.length > 0 && <Remark weight="note">Required and not measured: {notMeasured.map((stretch, at) => <span key={stretch.fromHz}>{at > 0 && ', '}<FrequencyRange {...stretch} significant={4} /></span>)}.</Remark>}
      <Remark>A dashed line with chevrons is a bound: the truth lies there or higher.</Remark>
      {driftDb !== null && <Remark weight="cite">IEEE Std 299-2006, 4.4: the reference is measured again at the end; a move of more than ±3 dB calls for a repeat.</Remark>}
    </Remarks>
  );
}

export function ThinnedRemark({ shown, all }: { shown: number; all: number }) {
  return (
    <Remarks about="the numbers">
      <Remark>Shown are {shown} of the curve’s {all} points. Where a pixel column holds more than two, its lowest and its highest stand for it; zoom in for more. The CSV holds them all.</Remark>
    </Remarks>
  );
}
