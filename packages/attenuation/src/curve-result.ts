import type { Doubt } from '@leeside/trace-reading/transcription';

export type Outcome = 'meets' | 'falls short' | 'too close to call' | 'beyond reach' | 'not all measured';

/** Parallel columns, one entry a frequency, ascending; NaN stands for "none". */
export interface CurvePoints {
  readonly frequencyHz: Float64Array;
  /** dB; the lower bound where `atLeast` is 1. */
  readonly attenuationDb: Float32Array;
  readonly atLeast: Uint8Array;
  /** dB; the lowest exact value among repeats where the curve itself is a bound. */
  readonly atMostDb: Float32Array;
  readonly ceilingDb: Float32Array;
  readonly expandedUncertaintyDb: Float32Array;
  readonly requiredDb: Float32Array;
  /** dB by which the true attenuation may lie higher, because noise lifted the enclosed reading. */
  readonly excessDb: Float32Array;
  readonly referenceLevel: Float32Array;
  readonly enclosedLevel: Float32Array;
  readonly floorLevel: Float32Array;
  readonly meanDb: Float32Array;
  readonly spreadDb: Float32Array;
  /** Index into `pairs` of the repeat that was worst. */
  readonly worstOf: Uint16Array;
}

export interface Lowest {
  readonly frequencyHz: number;
  readonly attenuationDb: number;
  readonly atLeast: boolean;
  readonly atMostDb: number | null;
}

export interface Band {
  readonly fromHz: number;
  readonly toHz: number;
  readonly kind: 'decade' | 'segment';
  readonly lowest: Lowest | null;
  readonly medianDb: number | null;
  readonly medianAtLeast: boolean;
  readonly q10Db: number | null;
  readonly q10AtLeast: boolean;
  readonly boundShare: number;
  readonly slopeDbPerDecade: number | null;
}

export type GapReason = 'reference too weak' | 'reference does not cover' | 'no reference' | 'units differ' | 'not read';
export interface Gap {
  readonly fromHz: number;
  readonly toHz: number;
  readonly reason: GapReason;
}

export type FloorSource = 'noise sweep' | 'beside the carriers' | 'typed' | 'none';
export interface Pair {
  readonly enclosed: string;
  readonly reference: string;
  readonly closing: string | null;
  readonly noise: string | null;
}

export interface CurveResult {
  readonly kind: 'curve';
  readonly style: 'spot' | 'comb' | 'continuous';
  readonly points: CurvePoints;
  readonly gaps: readonly Gap[];
  readonly bands: readonly Band[];
  readonly lowest: Lowest | null;
  readonly outcome: Outcome | null;
  readonly decidedAtHz: number | null;
  readonly notMeasured: readonly { fromHz: number; toHz: number }[];
  readonly doubts: readonly Doubt[];
  readonly floorSource: FloorSource;
  readonly driftDb: number | null;
  /** Trace ids of everything that went in, sorted. */
  readonly inputs: readonly string[];
  readonly pairs: readonly Pair[];
}

export type CurveOutcome = CurveResult | { readonly kind: 'no curve'; readonly reason: string; readonly doubts: readonly Doubt[] };
