#!/usr/bin/env node
import { parseArgs } from 'node:util';
import { measuringRoles } from '@leeside/contracts/measuring-roles';
import { listSessions } from '@leeside/contracts/sessions';
import { readConnection } from './configuration.js';
import { CommandFault, exitCode } from './exit-code.js';
import { helpText } from './help-text.js';
import { listenForInterruptions } from './interruptions.js';
import { login } from './login-command.js';
import { codeOfReading, describeReading, readLocally } from './read-command.js';
import { sendFolder } from './send-command.js';
import { askServer, callServer, ServerAway } from './server-call.js';

const optionKinds = {
  url: { type: 'string' }, session: { type: 'string' }, role: { type: 'string' }, sample: { type: 'string' }, condition: { type: 'string' },
  watch: { type: 'boolean', default: false }, csv: { type: 'boolean', default: false }, json: { type: 'boolean', default: false }, help: { type: 'boolean', default: false },
} as const;
const parseWords = (words: string[]) => parseArgs({ args: words, options: optionKinds, allowPositionals: true });
type Options = ReturnType<typeof parseWords>['values'];

const print = (text: string): void => void process.stdout.write(text.endsWith('\n') ? text : `${text}\n`);
const say = (text: string): void => void process.stderr.write(`${text}\n`);

function needed(value: string | undefined, what: string): string {
  if (value === undefined || value === '') throw new CommandFault(`${what} is missing. "leeside --help" shows how.`, exitCode.wrongUse);
  return value;
}

async function runSend(folder: string | undefined, options: Options): Promise<number> {
  const { stopping, leaving } = listenForInterruptions(say);
  const { role } = options;
  if (role !== undefined && !measuringRoles.some((one) => one === role)) throw new CommandFault(`"${role}" is no role: ${measuringRoles.join(', ')}.`, exitCode.wrongUse);
  const report = await sendFolder({ ...(await readConnection()), leaving }, {
    folder: needed(folder, 'The folder'), sessionId: needed(options.session, '--session ID'), watch: options.watch, say, stopping,
    ...(role === undefined ? {} : { role }),
    ...(options.sample === undefined ? {} : { sampleCode: options.sample }),
    ...(options.condition === undefined ? {} : { condition: options.condition }),
  });
  if (options.json) print(JSON.stringify(report.files));
  else if (report.files.length === 0) say('No file was sent.');
  else print(report.files.map((file) => `${file.state}\t${file.name}${file.problem ? `\t${file.problem}` : ''}`).join('\n'));
  return report.code;
}

async function runRead(path: string | undefined, options: Options): Promise<number> {
  const reading = await readLocally(needed(path, 'The file'));
  print(options.json ? JSON.stringify(reading, (_key, value: unknown) => (ArrayBuffer.isView(value) ? Array.from(value as Float32Array) : value)) : describeReading(reading));
  return codeOfReading(reading);
}

async function runSessions(options: Options): Promise<number> {
  const { items } = await askServer(await readConnection(), '/sessions', listSessions.answers[200]);
  print(options.json ? JSON.stringify(items) : items.map((session) => `${session.id}  ${session.heldOn}  ${session.title}`).join('\n'));
  return exitCode.done;
}

async function runCurve(id: string | undefined, options: Options): Promise<number> {
  const path = `/curves/${encodeURIComponent(needed(id, 'The id of the curve'))}${options.csv ? '.csv' : ''}`;
  print(await callServer(await readConnection(), path));
  return exitCode.done;
}

async function runLogin(options: Options): Promise<number> {
  print(await login(needed(options.url, '--url URL')));
  return exitCode.done;
}

async function run(words: string[]): Promise<number> {
  const { values, positionals: [command, argument] } = parseWords(words);
  if (values.help || command === undefined) {
    print(helpText);
    return values.help ? exitCode.done : exitCode.wrongUse;
  }
  switch (command) {
    case 'login': return runLogin(values);
    case 'sessions': return runSessions(values);
    case 'send': return runSend(argument, values);
    case 'read': return runRead(argument, values);
    case 'curve': return runCurve(argument, values);
    default: throw new CommandFault(`There is no command "${command}". "leeside --help" lists them.`, exitCode.wrongUse);
  }
}

run(process.argv.slice(2)).then((code) => {
  process.exitCode = code;
}, (fault: unknown) => {
  const isOurs = fault instanceof CommandFault || fault instanceof ServerAway;
  const isWrongWord = fault instanceof TypeError && 'code' in fault && String(fault.code).startsWith('ERR_PARSE_ARGS');
  say(isOurs || isWrongWord ? fault.message : String(fault instanceof Error ? fault.stack : fault));
  process.exitCode = fault instanceof CommandFault ? fault.code : isWrongWord ? exitCode.wrongUse : exitCode.failed;
});
