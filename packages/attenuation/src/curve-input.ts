import type { Sweep } from '@leeside/trace-reading/sweep';

/** What a sweep is in its session. */
export type Role = 'reference' | 'enclosed' | 'noise' | 'leakage' | 'ambient';

/** A sweep with all that a session knows of it. */
export interface MeasuredSweep {
  readonly traceId: string;
  readonly role: Role;
  readonly sweep: Sweep;
  readonly sampleId: string | null;
  readonly condition: string;
  readonly polarisation: string;
  readonly position: string;
  /** Milliseconds since 1970, UTC; null where nothing is known. */
  readonly measuredAtMs: number | null;
  /** Rises with every trace of the lab: stands in for the time where none is known. */
  readonly uploadOrder: number;
  /** What cable and pad take away between antenna and receiver, dB (a preamplifier counts negative); null is 0. */
  readonly chainLossDb: number | null;
  /** Level of the generator, dBm; null where it was not changed. */
  readonly transmitLevelDbm: number | null;
  /** A reference that a person chose. */
  readonly pairedWith: string | null;
}

/** A level read off the screen by eye. */
export interface TypedLevel {
  readonly id: string;
  readonly role: Role;
  readonly sampleId: string | null;
  readonly condition: string;
  readonly frequencyHz: number;
  readonly levelDbm: number;
  readonly inTheNoise: boolean;
  readonly order: number;
}

/** What a lab sets. */
export interface AnalysisParameters {
  /** m: how far above the floor a reading must stand at least, dB. */
  readonly floorMarginDb: number;
  /** Largest tolerated difference of opening and closing reference, dB. */
  readonly driftLimitDb: number;
  /** q: one reading stands for f/q to f·q. */
  readonly standsForRatio: number;
}

export interface Requirement {
  readonly id: string;
  readonly name: string;
  readonly rule: 'simple' | 'guarded';
  readonly guardFactor: number;
  readonly standsForRatio: number;
  readonly segments: readonly RequirementSegment[];
}

/** A straight piece over log frequency. */
export interface RequirementSegment {
  readonly fromHz: number;
  readonly toHz: number;
  readonly fromDb: number;
  readonly toDb: number;
}

/** Everything that one curve is computed from. */
export interface CurveInput {
  readonly enclosed: readonly MeasuredSweep[];
  readonly references: readonly MeasuredSweep[];
  readonly noises: readonly MeasuredSweep[];
  readonly leakages: readonly MeasuredSweep[];
  readonly ambients: readonly MeasuredSweep[];
  readonly levels: readonly TypedLevel[];
  readonly parameters: AnalysisParameters;
  readonly requirement: Requirement | null;
}
