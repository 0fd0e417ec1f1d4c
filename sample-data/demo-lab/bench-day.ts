import type { InsideSizeM } from '../physics/cavity-modes.js';
import type { Enclosure } from '../physics/enclosure.js';
import type { Receiver } from '../physics/receiver-noise.js';
import type { TransmitChain } from '../physics/transmit-chain.js';
import type { AnalyzerSettings } from '../writing/analyzer-trace.js';
import type { FileLayout } from '../writing/trace-bytes.js';

/** How a sample lies on the bench: which slot stands for its seams in this state. */
export interface OnTheBench {
  readonly sampleCode: string;
  readonly condition: string;
  readonly enclosure: Enclosure;
}

/** One sweep of a bench day. */
export interface PlannedSweep {
  readonly path: string;
  readonly layout: FileLayout;
  readonly role: 'reference' | 'enclosed' | 'noise';
  readonly onTheBench: OnTheBench | null;
  /** How far the generator has drifted by now, dB. */
  readonly driftDb: number;
  readonly measuredAt: string;
}

/** A bench day with one set-up. */
export interface BenchDay {
  readonly seed: number;
  readonly startHz: number;
  readonly stopHz: number;
  readonly points: number;
  readonly settings: AnalyzerSettings;
  readonly receiver: Receiver;
  readonly chain: TransmitChain;
  /** Where carriers stand, Hz; null for a tracking generator that fills every point. */
  readonly carrierStepHz: number | null;
  readonly sweeps: readonly PlannedSweep[];
}

/** An enclosure of a size, with walls and a slot. */
export function leakyEnclosure(insideSizeM: InsideSizeM, plateauDb: number, slotLengthM: number): Enclosure {
  return { plateauDb, slotLengthM, insideSizeM, dipDb: 6, quality: 45 };
}
