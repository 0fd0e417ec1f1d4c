import type { TruthFile } from '../../sample-data/truth/truth-set.js';
import type { CurveToJudge } from '../../sample-data/truth/judge-curve.js';

/** Where the system answers, and as whom a program speaks to it. */
export interface SystemAccess {
  readonly baseUrl: string;
  readonly token: string;
}

interface Progress { waiting: number; reading: number; needsAnswer: number; refused: number; curvesPending: number }
interface SessionAnswer { id: string; files: { name: string; state: string }[]; progress: Progress }
interface CurveAnswer { id: string; state: string; style: string; sampleId: string | null }

/** A curve as the API gives it, with all that a truth set can be asked of it. */
export interface CurveThroughApi {
  readonly sampleId: string | null;
  readonly expectedSampleId: string;
  readonly state: string;
  readonly style: string;
  readonly points: CurveToJudge;
}

async function call<Answer>(access: SystemAccess, method: 'GET' | 'POST', path: string, body?: object): Promise<Answer> {
  const isForm = body instanceof FormData;
  const response = await fetch(`${access.baseUrl}/api/v1${path}`, {
    method,
    headers: { authorization: `Bearer ${access.token}`, ...(body === undefined || isForm ? {} : { 'content-type': 'application/json' }) },
    ...(body === undefined ? {} : { body: isForm ? body : JSON.stringify(body) }),
  });
  if (!response.ok) throw new Error(`${method} ${path} answered ${response.status.toString()}: ${await response.text()}`);
  return await response.json() as Answer;
}

function formOf(files: readonly TruthFile[], sampleId: string): FormData {
  const form = new FormData();
  form.append('condition', 'as delivered');
  for (const file of files) {
    form.append('role', file.role);
    form.append('sampleId', file.role === 'enclosed' ? sampleId : '');
    form.append('measuredAt', file.measuredAt);
    form.append('file', new Blob([new Uint8Array(file.bytes)]), file.name);
  }
  return form;
}

async function settled(access: SystemAccess, sessionId: string): Promise<SessionAnswer> {
  const deadline = Date.now() + 90_000;
  for (;;) {
    const session = await call<SessionAnswer>(access, 'GET', `/sessions/${sessionId}`);
    const { waiting, reading, curvesPending } = session.progress;
    if (waiting + reading + curvesPending === 0) return session;
    if (Date.now() > deadline) throw new Error(`Session ${sessionId} did not settle: ${JSON.stringify(session.progress)}`);
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
}

/**
 * Takes a sample in, opens a session, sends a set's files with their roles, waits until all is worked out, and fetches the curve.
 * @param code sample code, new for each call.
 */
export async function sendTruthSet(access: SystemAccess, code: string, files: readonly TruthFile[]): Promise<CurveThroughApi> {
  const sample = await call<{ id: string }>(access, 'POST', '/samples', { code, name: `Sample ${code}` });
  const opened = await call<{ id: string }>(access, 'POST', '/sessions', { title: `Truth ${code}`, heldOn: '2026-11-10' });
  const sent = await call<{ items: { name: string }[] }>(access, 'POST', `/sessions/${opened.id}/files`, formOf(files, sample.id));
  if (sent.items.length !== files.length) throw new Error(`${sent.items.length.toString()} of ${files.length.toString()} files were taken`);
  const session = await settled(access, opened.id);
  const notRead = session.files.filter((file) => file.state !== 'read');
  if (notRead.length > 0) throw new Error(`Not read: ${JSON.stringify(notRead.slice(0, 5))}`);
  const curves = await call<{ items: CurveAnswer[] }>(access, 'GET', `/sessions/${opened.id}/curves`);
  const [curve] = curves.items;
  if (curve === undefined || curves.items.length !== 1) throw new Error(`${curves.items.length.toString()} curves instead of one`);
  const points = await call<CurveToJudge>(access, 'GET', `/curves/${curve.id}/points`);
  return { sampleId: curve.sampleId, expectedSampleId: sample.id, state: curve.state, style: curve.style, points };
}
