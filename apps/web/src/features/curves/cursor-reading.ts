import type { CurvePointsBody } from '@leeside/contracts/curves';
import { formatFrequency, formatLevel } from '@leeside/units/format-quantity';
import { attenuationInWords } from '../../components/shown-attenuation';

export interface CursorReading {
  hz: number;
  attenuationDb: number;
  atLeast: boolean;
  atMostDb: number | null;
  ceilingDb: number | null;
  uncertaintyDb: number | null;
  requiredDb: number | null;
  /** Attenuation less what is required; of a bound it is itself a bound. */
  marginDb: number | null;
}

/** What the plot's cursor reads at one point; null outside the points. */
export function readingAt(points: CurvePointsBody, at: number): CursorReading | null {
  const hz = points.frequencyHz[at];
  const attenuationDb = points.attenuationDb[at];
  if (hz === undefined || attenuationDb === undefined) return null;
  const requiredDb = points.requiredDb[at] ?? null;
  return {
    hz, attenuationDb, atLeast: points.atLeast[at] === true, atMostDb: points.atMostDb[at] ?? null, ceilingDb: points.ceilingDb[at] ?? null,
    uncertaintyDb: points.expandedUncertaintyDb[at] ?? null, requiredDb, marginDb: requiredDb === null ? null : attenuationDb - requiredDb,
  };
}

/** The same in one sentence, for those who listen to it. */
export function readingAloud(reading: CursorReading, locale: string): string {
  const { hz, attenuationDb, atLeast, ceilingDb, requiredDb, marginDb } = reading;
  const said = [
    `${formatFrequency(hz, 6, locale)}: attenuation ${attenuationInWords(attenuationDb, atLeast, locale)}`,
    ceilingDb === null ? 'ceiling not known' : `ceiling ${formatLevel(ceilingDb, 'dB', 1, locale)}`,
    ...(requiredDb === null ? [] : [`required ${formatLevel(requiredDb, 'dB', 1, locale)}`]),
    ...(marginDb === null ? [] : [`margin ${attenuationInWords(marginDb, atLeast, locale)}`]),
  ];
  return `${said.join(', ')}.`;
}

/** The indices of the rows that the table shows. */
export function chosenRows(points: CurvePointsBody, choice: 'all' | 'bounds' | 'below'): number[] {
  const all = points.frequencyHz.map((_, at) => at);
  if (choice === 'bounds') return all.filter((at) => points.atLeast[at] === true);
  if (choice === 'below') return all.filter((at) => (readingAt(points, at)?.marginDb ?? 0) < 0);
  return all;
}
