import type { CurveToJudge } from '../../sample-data/truth/judge-curve.js';
import type { TruthFile } from '../../sample-data/truth/truth-set.js';
import type { ApiClient, UploadPart } from './api-client.js';

/** A curve as the API gives it, with all that a truth set can be asked of it. */
export interface CurveThroughApi {
  readonly sampleId: string | null;
  readonly expectedSampleId: string;
  readonly state: string;
  readonly style: string;
  readonly points: CurveToJudge;
}

function partsOf(files: readonly TruthFile[], sampleId: string): UploadPart[] {
  return files.flatMap((file) => [
    { field: 'role', value: file.role },
    { field: 'sampleId', value: file.role === 'enclosed' ? sampleId : '' },
    { field: 'measuredAt', value: file.measuredAt },
    { fileName: file.name, bytes: file.bytes },
  ]);
}

/**
 * Takes a sample in, opens a session, sends a set's files with their roles, waits until all is worked out, and fetches the curve.
 * @param code sample code, new for each call.
 */
export async function sendTruthSet(client: ApiClient, code: string, files: readonly TruthFile[]): Promise<CurveThroughApi> {
  const sample = await client.post<{ id: string }>('/samples', { code, name: `Sample ${code}` });
  const opened = await client.post<{ id: string }>('/sessions', { title: `Truth ${code}`, heldOn: '2026-11-10' });
  const sent = await client.upload<{ items: unknown[] }>(opened.id, partsOf(files, sample.id));
  if (sent.items.length !== files.length) throw new Error(`${sent.items.length.toString()} of ${files.length.toString()} files were taken`);
  const session = await client.settled(opened.id, 90_000);
  const notRead = session.files.filter((file) => file.state !== 'read');
  if (notRead.length > 0) throw new Error(`Not read: ${JSON.stringify(notRead.slice(0, 5))}`);
  const curves = await client.get<{ items: { id: string; state: string; style: string; sampleId: string | null }[] }>(`/sessions/${opened.id}/curves`);
  const [curve] = curves.items;
  if (curve === undefined || curves.items.length !== 1) throw new Error(`${curves.items.length.toString()} curves instead of one`);
  const points = await client.get<CurveToJudge>(`/curves/${curve.id}/points`);
  return { sampleId: curve.sampleId, expectedSampleId: sample.id, state: curve.state, style: curve.style, points };
}
