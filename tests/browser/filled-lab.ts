import { readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { apiClient, type UploadPart } from '../journeys/api-client.js';
import type { RunningSystem } from '../journeys/running-system.js';

const firstSession = fileURLToPath(new URL('../../sample-data/first-session/', import.meta.url));
export const firstSessionFiles = ['reference-opening.csv', 'noise-generator-off.csv', 'enclosed-MP24-011.csv'].map((name) => `${firstSession}${name}`);

export interface FilledLab {
  sessionId: string; curveId: string; fileId: string; spotCurveId: string; troubledSessionId: string; askingFileId: string; refusedFileId: string;
  sampleId: string; requirementId: string;
}

interface Listed { items: { id: string; name: string; code?: string }[] }

const text = (fileName: string, content: string): UploadPart => ({ fileName, bytes: new TextEncoder().encode(content) });

const readPart = async (path: string): Promise<UploadPart> => ({ fileName: path.split('/').at(-1) ?? path, bytes: await readFile(path) });

const spotFrequenciesHz = [100e6, 433.92e6, 915e6, 2.4e9];
const spotLevels = spotFrequenciesHz.flatMap((frequencyHz, at) => [
  { role: 'reference', frequencyHz, levelDbm: -21 - at },
  { role: 'enclosed', frequencyHz, levelDbm: at === 0 ? -98 : -85 + 4 * at, inTheNoise: at === 0, condition: 'one roll' },
]);

const idOf = ({ items }: Listed, which: (item: Listed['items'][number], at: number) => boolean): string => {
  const found = items.find(which);
  if (!found) throw new Error(`Not among ${items.map(({ name }) => name).join(', ')}.`);
  return found.id;
};
const firstOf = (list: Listed): string => idOf(list, (_, at) => at === 0);

/** A session with a curve, one with typed levels alone, and one whose files ask or are refused. */
export async function fillLab(system: RunningSystem): Promise<FilledLab> {
  const api = apiClient(system.baseUrl, await system.tokenOf('engineer'));
  const requirements = await api.get<Listed>('/requirements');
  const samples = await api.get<Listed>('/samples?limit=200');
  const sampleId = idOf(samples, ({ code }) => code === 'MP24-011');
  const requirementId = idOf(requirements, ({ name }) => name.startsWith('Portable'));
  const open = (title: string) => api.post<{ id: string }>('/sessions', { title, heldOn: '2026-11-30', requirementId });

  const session = await open('Pouches on the long bench');
  await api.upload(session.id, await Promise.all(firstSessionFiles.map(readPart)));
  const settled = await api.settled(session.id);
  const curves = await api.get<Listed>(`/sessions/${session.id}/curves`);

  const spot = await open('Four carriers by eye');
  await api.post(`/sessions/${spot.id}/levels`, { items: spotLevels.map((level) => (level.role === 'enclosed' ? { ...level, sampleId } : level)) });
  await api.settled(spot.id);
  const spotCurves = await api.get<Listed>(`/sessions/${spot.id}/curves`);

  const troubled = await open('Files from a borrowed analyzer');
  const rows = Array.from({ length: 40 }, (_, at) => `${String(100 + at * 10)},-${String(50 + at)}`).join('\n');
  const uploaded = await api.upload<Listed>(troubled.id, [text('readings.csv', `${rows}\n`), text('letter.csv', 'Dear lab,\nplease find the pouches in the parcel.\n')]);
  await api.settled(troubled.id);
  return {
    sessionId: session.id, curveId: firstOf(curves), fileId: firstOf({ items: [...settled.files] }), spotCurveId: firstOf(spotCurves),
    troubledSessionId: troubled.id, askingFileId: firstOf(uploaded), refusedFileId: idOf(uploaded, (_, at) => at === 1), sampleId, requirementId,
  };
}
