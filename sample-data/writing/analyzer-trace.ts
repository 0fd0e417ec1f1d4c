/** Settings that an invented analyzer writes above its rows. */
export interface AnalyzerSettings {
  readonly rbwHz: number;
  readonly vbwHz: number;
  readonly detector: 'Positive Peak' | 'RMS';
  readonly traceMode: 'Max Hold' | 'Clear Write' | 'Average';
  /** Sweeps held or averaged. */
  readonly held: number;
  readonly inputAttenuationDb: number;
  readonly referenceLevelDbm: number;
}

/** A trace about to be written. */
export interface AnalyzerTrace {
  readonly frequencyHz: Float64Array;
  readonly levelDbm: Float64Array;
  /** Null: the file tells nothing of its settings. */
  readonly settings: AnalyzerSettings | null;
  /** Local time at the bench, ISO 8601 without zone. */
  readonly takenAt: string;
}
