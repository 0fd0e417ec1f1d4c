import type { SendLedger } from './send-ledger.js';
import type { SendingFields } from './send-files.js';
import type { ServerLine } from './server-call.js';

export interface SendOptions {
  readonly folder: string;
  readonly sessionId: string;
  readonly role?: string;
  readonly sampleCode?: string;
  readonly condition?: string;
  readonly watch: boolean;
  readonly say: (words: string) => void;
  /** Asks to finish what is under way and begin nothing new. */
  readonly stopping: AbortSignal;
}

/** One run of `send`. */
export interface SendRun {
  readonly line: ServerLine;
  readonly options: SendOptions;
  readonly fields: SendingFields;
  readonly ledger: SendLedger;
}
