import type { SweepSettings } from '@leeside/trace-reading/sweep';
import type { TrueSweep } from './true-sweep.js';

/** What must become of a file: its true sweeps, a question, or a refusal with its line. */
export type Expected =
  | { readonly kind: 'read'; readonly sweeps: readonly TrueSweep[]; readonly settings?: SweepSettings; readonly doubts?: readonly string[] }
  | { readonly kind: 'question'; readonly code: string; readonly line?: number; readonly answered?: readonly AnsweredReading[] }
  | { readonly kind: 'refused'; readonly code: string; readonly line?: number };

/** One choice of a question, and the sweeps it must lead to. */
export interface AnsweredReading {
  readonly choiceId: string;
  readonly sweeps: readonly TrueSweep[];
}

/** A file of a certain layout or with a certain fault, named after it. */
export interface Fixture {
  readonly file: string;
  readonly bytes: () => Uint8Array;
  readonly expected: Expected;
  /** Made in memory only. */
  readonly isBig?: boolean;
}
