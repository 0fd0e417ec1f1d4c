import type { Sweep, SweepSettings } from './sweep.js';

/** How a file was understood; each decision names by what it was taken. Lines count from 1. */
export interface Transcription {
  encoding: string;
  delimiter: string | null;
  decimalMark: '.' | ',' | null;
  frequencyUnit: string | null;
  /** As the file declares it, before any conversion. */
  levelUnit: string | null;
  headerLine: number | null;
  firstDataLine: number | null;
  rowsKept: number;
  rowsSkipped: number;
  settings: SweepSettings;
  decidedBy: Record<string, string>;
}

/** Something that may make a result wrong, kept with it and never silenced. */
export interface Doubt {
  readonly code: string;
  readonly weight: 'note' | 'doubt' | 'stops signing';
  readonly message: string;
  readonly line?: number;
}

/** Why a file cannot be read, and where. */
export interface Problem {
  readonly code: string;
  readonly message: string;
  readonly line?: number;
  readonly column?: number;
}

/** What only a person can know; `sample` shows three rows as each choice would read them. */
export interface Question {
  readonly id: string;
  readonly code: string;
  readonly message: string;
  readonly lines: readonly number[];
  readonly choices: readonly { readonly id: string; readonly label: string; readonly sample: string }[];
}

export interface ReadSweep {
  readonly name: string;
  readonly sweep: Sweep;
  /** ISO 8601 as far as the file tells it without doubt. */
  readonly measuredAt?: string;
  /** The time as the file words it. */
  readonly measuredAtText?: string;
}

/** What became of a file. */
export type TraceReading =
  | { readonly kind: 'read'; readonly sweeps: readonly ReadSweep[]; readonly transcription: Transcription; readonly doubts: readonly Doubt[] }
  | { readonly kind: 'question'; readonly questions: readonly Question[]; readonly transcription: Transcription; readonly doubts: readonly Doubt[] }
  | { readonly kind: 'refused'; readonly problem: Problem; readonly doubts: readonly Doubt[]; readonly transcription?: Transcription };
