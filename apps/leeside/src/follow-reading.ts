import { getFile, type FileBody } from '@leeside/contracts/files';
import type { FileOutcome } from './send-ledger.js';
import type { SendRun } from './send-run.js';
import { askServer, pause, untilServerAnswers } from './server-call.js';
import { benchPace } from './pace.js';

const filesPerLook = 8;

function sayNews({ options }: SendRun, earlier: FileOutcome, { name, state, problem }: FileOutcome): void {
  if (!options.watch || problem === undefined) return;
  if (earlier.state !== state || earlier.problem !== problem) options.say(`${state}: ${name}: ${problem}`);
}

function noteReading(run: SendRun, file: FileBody): void {
  const { outcomes } = run.ledger;
  const problem = file.problem?.message ?? file.questions?.[0]?.message;
  for (const [mark, earlier] of outcomes) {
    if (earlier.id !== file.id) continue;
    const outcome: FileOutcome = { name: earlier.name, id: file.id, state: file.state, ...(problem === undefined ? {} : { problem }) };
    outcomes.set(mark, outcome);
    sayNews(run, earlier, outcome);
  }
}

/** Looks once at a few of the files that are being read; those that are still unread go to the end of the line. */
export async function lookAtUnread(run: SendRun): Promise<void> {
  const { line, ledger, options } = run;
  const ids = ledger.unreadIds.slice(0, filesPerLook);
  const files = await untilServerAnswers(line, options.say, () => Promise.all(ids.map((id) => askServer(line, `/files/${id}`, getFile.answers[200]))));
  files.forEach((file) => noteReading(run, file));
  const unread = files.filter(({ state }) => state === 'waiting' || state === 'reading').map(({ id }) => id);
  ledger.unreadIds = [...ledger.unreadIds.slice(ids.length), ...unread];
}

/** Looks until each stored file is read. What was refused or asked something before may have been read since, and is looked at again. */
export async function waitUntilRead(run: SendRun): Promise<void> {
  const { line, ledger } = run;
  const unsettled = [...ledger.outcomes.values()].flatMap(({ id, state }) => (id !== null && state !== 'read' ? [id] : []));
  ledger.unreadIds = [...new Set(unsettled)];
  let unreadBefore = Infinity;
  while (ledger.unreadIds.length > 0) {
    await lookAtUnread(run);
    if (ledger.unreadIds.length > 0 && ledger.unreadIds.length >= unreadBefore) await pause(line, (line.pace ?? benchPace).restMs);
    unreadBefore = ledger.unreadIds.length;
  }
}
