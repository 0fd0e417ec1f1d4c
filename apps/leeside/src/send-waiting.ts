import { uploadLimits } from '@leeside/contracts/files';
import { bytesOf, markOf, type FileBytes, type FolderFile } from './folder-files.js';
import { packFiles, sendParcel } from './send-files.js';
import { isStored, noteOutcome } from './send-ledger.js';
import type { SendRun } from './send-run.js';
import { untilServerAnswers } from './server-call.js';

const filesPerRequest = 50;
const bytesPerRequest = 64 * 1024 * 1024;

/** The next files that fit one request. */
function nextBatch(files: readonly FolderFile[]): FolderFile[] {
  const batch: FolderFile[] = [];
  let byteCount = 0;
  for (const file of files.slice(0, filesPerRequest)) {
    byteCount += file.byteCount;
    if (batch.length > 0 && byteCount > bytesPerRequest) break;
    batch.push(file);
  }
  return batch;
}

/** Notes a file as not sent; says so the first time. While we watch, it is tried again at the next look. */
function leaveOut({ ledger, options }: SendRun, file: FolderFile, problem: string): void {
  if (ledger.outcomes.get(markOf(file))?.problem !== problem) options.say(`not sent: ${file.name}: ${problem}`);
  noteOutcome(ledger, file, { id: null, state: 'not sent', problem });
}

async function readBatch(run: SendRun, batch: readonly FolderFile[]): Promise<(FolderFile & FileBytes)[]> {
  const whole: (FolderFile & FileBytes)[] = [];
  for (const file of batch) {
    const content = await bytesOf(file);
    if (typeof content === 'string') leaveOut(run, file, content);
    else whole.push({ ...file, ...content });
  }
  return whole;
}

/** Sends a batch until the server has confirmed it; the bytes are read once, so that every try is the same request. */
async function sendBatch(run: SendRun, batch: readonly FolderFile[]): Promise<number> {
  const { line, options, ledger } = run;
  const whole = await readBatch(run, batch);
  if (whole.length === 0) return 0;
  const parcel = packFiles(options.sessionId, whole, run.fields);
  whole.forEach((file) => noteOutcome(ledger, file, { id: null, state: 'not confirmed', problem: 'The server did not answer. Send the folder again: what is stored is not stored twice.' }));
  const answers = await untilServerAnswers(line, options.say, () => sendParcel(line, parcel));
  whole.forEach((file, at) => {
    const answer = answers[at];
    if (answer) noteOutcome(ledger, file, { id: answer.id, state: answer.state });
  });
  ledger.unreadIds = [...new Set([...ledger.unreadIds, ...answers.map(({ id }) => id)])];
  return whole.length;
}

/** Sends those of the given files that are not stored yet, batch by batch; stops between two batches. Returns how many were sent. */
export async function sendWaiting(run: SendRun, files: readonly FolderFile[]): Promise<number> {
  const waiting = files.filter((file) => !isStored(run.ledger, file));
  for (const file of waiting) {
    if (file.byteCount > uploadLimits.fileBytes) leaveOut(run, file, `It is larger than ${uploadLimits.fileBytes / 1024 ** 2} MiB.`);
  }
  let sentCount = 0;
  for (let left = waiting.filter((file) => file.byteCount <= uploadLimits.fileBytes); left.length > 0;) {
    if (run.options.stopping.aborted) {
      left.forEach((file) => noteOutcome(run.ledger, file, { id: null, state: 'not sent', problem: 'Stopped before its turn.' }));
      break;
    }
    const batch = nextBatch(left);
    left = left.slice(batch.length);
    const count = await sendBatch(run, batch);
    sentCount += count;
    if (count > 0) run.options.say(`${sentCount} sent${left.length > 0 ? `, ${left.length} to go` : ''}`);
  }
  return sentCount;
}
