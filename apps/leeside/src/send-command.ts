import { listSamples } from '@leeside/contracts/samples';
import { CommandFault, exitCode, Interrupted } from './exit-code.js';
import { filesOfFolder, type FolderFile } from './folder-files.js';
import { lookAtUnread, waitUntilRead } from './follow-reading.js';
import { benchPace } from './pace.js';
import type { SendingFields } from './send-files.js';
import { codeOfOutcomes, openLedger, type FileOutcome } from './send-ledger.js';
import type { SendOptions, SendRun } from './send-run.js';
import { sendWaiting } from './send-waiting.js';
import { askServer, pause, untilServerAnswers, type ServerLine } from './server-call.js';
import { makeSettledFiles } from './settled-files.js';

export interface SendReport {
  readonly files: readonly FileOutcome[];
  readonly code: number;
}

async function sampleIdOf(line: ServerLine, code: string, say: (words: string) => void): Promise<string> {
  const page = await untilServerAnswers(line, say, () => askServer(line, `/samples?code=${encodeURIComponent(code)}`, listSamples.answers[200]));
  const sample = page.items.find((one) => one.code === code);
  if (!sample) throw new CommandFault(`There is no sample with the code ${code}.`);
  return sample.id;
}

async function fieldsOf(line: ServerLine, { role, sampleCode, condition, say }: SendOptions): Promise<SendingFields> {
  return {
    ...(role === undefined ? {} : { role }),
    ...(sampleCode === undefined ? {} : { sampleId: await sampleIdOf(line, sampleCode, say) }),
    ...(condition === undefined ? {} : { condition }),
  };
}

/** The folder while we watch: a share that is away for a while comes back. */
function makeFolderLook({ folder, say }: SendOptions): () => Promise<FolderFile[]> {
  let problem: string | null = null;
  return async () => {
    try {
      const files = await filesOfFolder(folder);
      problem = null;
      return files;
    } catch (fault) {
      if (!(fault instanceof CommandFault)) throw fault;
      if (fault.message !== problem) say(fault.message);
      problem = fault.message;
      return [];
    }
  };
}

/** Sends what appears in the folder, once it is whole, until we are asked to stop. */
async function watchFolder(run: SendRun): Promise<void> {
  const { line, options, ledger } = run;
  const pace = line.pace ?? benchPace;
  const settled = makeSettledFiles(pace.quietMs);
  const look = makeFolderLook(options);
  while (!options.stopping.aborted) {
    const count = await sendWaiting(run, settled(await look()));
    if (ledger.unreadIds.length > 0) await lookAtUnread(run);
    if (count === 0) await pause(line, pace.restMs);
  }
}

/**
 * Sends a folder and waits until each file is read; with `watch` it goes on until it is asked to stop. When we leave
 * before the end, the report says how far it came.
 */
export async function sendFolder(line: ServerLine, options: SendOptions): Promise<SendReport> {
  const present = await filesOfFolder(options.folder);
  const ledger = openLedger();
  const report = (code?: number): SendReport => {
    const files = [...ledger.outcomes.values()];
    return { files, code: code ?? codeOfOutcomes(files) };
  };
  try {
    const run = { line, options, fields: await fieldsOf(line, options), ledger };
    await (options.watch ? watchFolder(run) : sendWaiting(run, present));
    await waitUntilRead(run);
    return report();
  } catch (fault) {
    if (fault instanceof Interrupted) return report(exitCode.interrupted);
    throw fault;
  }
}
