import { log10Of, powerOfTen } from '@leeside/units/logarithm';

export interface Segment { fromHz: number; toHz: number; fromDb: number; toDb: number }
export interface WallPoint { hz: number; db: number }

const stepsOnLinearAxis = 24;

/** The required attenuation on a segment, straight in the logarithm of frequency; null outside. */
export function requiredAt({ fromHz, toHz, fromDb, toDb }: Segment, hz: number): number | null {
  if (hz < fromHz || hz > toHz) return null;
  return fromDb + ((toDb - fromDb) * log10Of(hz / fromHz)) / log10Of(toHz / fromHz);
}

/** The top of the wall that a segment is, clipped to the window; null where the window does not meet it. */
export function wallTop(segment: Segment, window: { fromHz: number; toHz: number }): WallPoint[] | null {
  const fromHz = Math.max(segment.fromHz, window.fromHz);
  const toHz = Math.min(segment.toHz, window.toHz);
  if (fromHz >= toHz) return null;
  const ratio = log10Of(toHz / fromHz);
  return Array.from({ length: stepsOnLinearAxis + 1 }, (_, step) => {
    const hz = step === stepsOnLinearAxis ? toHz : fromHz * powerOfTen((ratio * step) / stepsOnLinearAxis);
    return { hz, db: requiredAt(segment, hz) ?? segment.toDb };
  });
}

const edgeShare = 0.1;

/** Where the name of the last segment stands: at the right edge of the window, or at its own end where that lies well inside; null where it is out of sight. */
export function nameOfWall(segments: readonly Segment[], window: { fromHz: number; toHz: number }): { at: 'edge' | 'own end'; db: number; hz: number } | null {
  const last = segments.findLast((segment) => segment.fromHz < window.toHz && segment.toHz > window.fromHz);
  if (!last) return null;
  const hz = Math.min(last.toHz, window.toHz);
  const edgeHz = window.toHz / (window.toHz / window.fromHz) ** edgeShare;
  return { at: hz >= edgeHz ? 'edge' : 'own end', hz, db: requiredAt(last, hz) ?? last.toDb };
}
