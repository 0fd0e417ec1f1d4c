import type { TraceReading } from '@leeside/trace-reading/transcription';

/** What the worker asks its reader process. */
export interface ReadingRequest {
  readonly storeFolder: string;
  readonly key: string;
  readonly sha256: string;
  readonly byteCount: number;
  readonly fileName: string;
  readonly impedanceOhm: number;
  readonly answers: { questionId: string; choiceId: string }[];
}

/** What comes back: a reading, or that the stored bytes are not those that came. */
export type ReadingAnswer =
  | { readonly kind: 'reading'; readonly reading: TraceReading }
  | { readonly kind: 'missing' }
  | { readonly kind: 'damaged'; readonly found: string };
