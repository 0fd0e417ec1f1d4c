import type { FileLayout } from '../writing/trace-bytes.js';

/** How a set of invented files is made. */
export interface TruthOptions {
  readonly seed: number;
  readonly style: 'continuous' | 'comb' | 'spot';
  /** Points of each sweep inside and of noise, 600 to 4001. */
  readonly points: number;
  /** Points of each reference over the same band. */
  readonly referencePoints: number;
  /** Bins from one carrier of a comb to the next; nothing to other styles. */
  readonly combSpacingBins: number;
  /** Width of a spot sweep in RBW; nothing to other styles. */
  readonly spotSpanInRbw: number;
  /** Steps in which levels are written, dB. */
  readonly quantumDb: number;
  /** Sweeps held (or averaged) in each role. */
  readonly looks: { readonly reference: number; readonly enclosed: number; readonly noise: number };
  readonly combined: 'held' | 'averaged';
  readonly noiseSweep: boolean;
  /** For spots so narrow that 40 MHz lies more than half a span above 0. */
  readonly rbwHz: number;
  readonly layout: FileLayout;
  /** False: no file tells its settings. */
  readonly settingsWritten: boolean;
}

/** A file of a set, as a bench laptop would send it in. */
export interface TruthFile {
  readonly name: string;
  readonly role: 'reference' | 'enclosed' | 'noise';
  readonly bytes: Uint8Array;
  readonly measuredAt: string;
}

/** What is true, at each carrier (comb, spot) or bin (continuous); parallel arrays. */
export interface Truth {
  readonly style: TruthOptions['style'];
  readonly frequencyHz: Float64Array;
  readonly trueAttenuationDb: Float64Array;
  /** In the open, without noise, at the time of the enclosed sweep, dBm. */
  readonly referenceLevelDbm: Float64Array;
  /** Inside, without noise, dBm. */
  readonly enclosedSignalDbm: Float64Array;
  /** Mean noise power in the RBW, dBm. */
  readonly meanNoiseDbm: Float64Array;
  /** A point of a curve belongs to a carrier or bin that is at most this far away, Hz. */
  readonly toleranceHz: number;
  /** Looks of the enclosed sweep, over which an excess is looked up; 1 where they were averaged. */
  readonly heldLooks: number;
  /** False where nothing in the files shows the noise: then nothing can be called a bound. */
  readonly floorKnown: boolean;
}

/** Files and what is true of them. */
export interface TruthSet {
  readonly files: readonly TruthFile[];
  readonly truth: Truth;
}
