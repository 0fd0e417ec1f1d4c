/** How fast the command goes about its work. */
export interface Pace {
  /** Between two looks at a folder or at files that are being read. */
  readonly restMs: number;
  /** How long a file has to stay as it is before it counts as whole. */
  readonly quietMs: number;
  /** The first pause after the server was away; each further one is twice as long, up to the longest. */
  readonly firstPauseMs: number;
  readonly longestPauseMs: number;
  /** How long an answer may take, besides the time that the bytes of a batch need on the slowest line we expect. */
  readonly answerWithinMs: number;
  readonly slowestBytesPerSecond: number;
}

export const benchPace: Pace = { restMs: 500, quietMs: 1000, firstPauseMs: 500, longestPauseMs: 30_000, answerWithinMs: 30_000, slowestBytesPerSecond: 50_000 };
