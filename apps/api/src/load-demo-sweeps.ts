import { readFile } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { uploadFiles } from '@leeside/contracts/files';
import { addLevels } from '@leeside/contracts/levels';
import { listRequirements } from '@leeside/contracts/requirements';
import { listSamples } from '@leeside/contracts/samples';
import { createSession, listSessions } from '@leeside/contracts/sessions';
import { readConfiguration } from './configuration.js';
import { demoAccounts } from './demo/demo-accounts.js';
import { signInDemo, type DemoClient } from './demo/demo-client.js';
import { demoFolder, readDemoManifest, type DemoManifest, type DemoSession } from './demo/demo-manifest.js';

/** The fields of each file before the file itself; an empty one clears what the file before had. */
async function uploadForm(session: DemoSession, samples: ReadonlyMap<string, string>): Promise<FormData> {
  const form = new FormData();
  for (const { path, role, sampleCode, condition, polarisation, position, measuredAt } of session.files) {
    const fields = { role, sampleId: sampleCode === null ? '' : (samples.get(sampleCode) ?? ''), condition: condition ?? '', polarisation, position, measuredAt };
    for (const [name, value] of Object.entries(fields)) form.append(name, value);
    form.append('file', new Blob([new Uint8Array(await readFile(join(demoFolder, path)))]), basename(path));
  }
  return form;
}

async function loadSession(client: DemoClient, session: DemoSession, { samples, requirementId }: { samples: ReadonlyMap<string, string>; requirementId: string | undefined }): Promise<void> {
  const { title, heldOn, impedanceOhm, floorMarginDb, notes } = session;
  const known = (await client.ask('/sessions', listSessions.answers[200])).items.find((one) => one.title === title && one.heldOn === heldOn);
  const opened = known ?? (await client.send('/sessions', { title, heldOn, impedanceOhm, floorMarginDb, notes, ...(requirementId === undefined ? {} : { requirementId }) }, createSession.answers[201]));
  await client.send(`/sessions/${opened.id}/files`, await uploadForm(session, samples), uploadFiles.answers[202]);
  if (known === undefined && session.levels.length > 0) {
    const items = session.levels.map(({ role, sampleCode, condition, ...level }) => ({ role, ...level, ...(sampleCode === null ? {} : { sampleId: samples.get(sampleCode) }), ...(condition === null ? {} : { condition }) }));
    await client.send(`/sessions/${opened.id}/levels`, { items }, addLevels.answers[201]);
  }
}

async function loadAll(client: DemoClient, manifest: DemoManifest): Promise<void> {
  const samples = new Map((await client.ask('/samples?limit=200', listSamples.answers[200])).items.map(({ code, id }) => [code, id]));
  const requirements = new Map((await client.ask('/requirements?limit=200', listRequirements.answers[200])).items.map(({ name, id }) => [name, id]));
  for (const session of manifest.sessions) {
    const name = manifest.requirements.find(({ key }) => key === session.requirementKey)?.name ?? '';
    await loadSession(client, session, { samples, requirementId: requirements.get(name) });
  }
}

const configuration = readConfiguration();
if (configuration.demoPassword === null) throw new Error('DEMO_PASSWORD must be set.');
const client = await signInDemo(`http://127.0.0.1:${configuration.port}`, demoAccounts[0]?.email ?? '', configuration.demoPassword);
await loadAll(client, await readDemoManifest());
