import { setTimeout as rest } from 'node:timers/promises';

/** A program's view of the API, by bearer token. */
export interface ApiClient {
  get<Body = unknown>(path: string): Promise<Body>;
  post<Body = unknown>(path: string, body: object): Promise<Body>;
  patch<Body = unknown>(path: string, body: object): Promise<Body>;
  upload<Body = unknown>(sessionId: string, parts: readonly UploadPart[]): Promise<Body>;
  /** Waits until nothing of the session is waiting, being read or pending. */
  settled(sessionId: string, longestMs?: number): Promise<SessionBody>;
}
export type UploadPart = { readonly field: string; readonly value: string } | { readonly fileName: string; readonly bytes: Uint8Array };
export interface SessionBody {
  readonly id: string;
  readonly files: readonly { id: string; name: string; state: string }[];
  readonly progress: Readonly<Record<'waiting' | 'reading' | 'read' | 'needsAnswer' | 'refused' | 'curvesPending' | 'curvesReady', number>>;
}

async function bodyOf<Body>(response: Response): Promise<Body> {
  const text = await response.text();
  if (!response.ok) throw new Error(`HTTP ${response.status}: ${text.slice(0, 500)}`);
  return (response.headers.get('Content-Type')?.includes('json') ? JSON.parse(text) : text) as Body;
}

export function uploadForm(parts: readonly UploadPart[]): FormData {
  const form = new FormData();
  for (const part of parts) {
    if ('field' in part) form.append(part.field, part.value);
    else form.append('file', new Blob([Uint8Array.from(part.bytes)]), part.fileName);
  }
  return form;
}

export function apiClient(baseUrl: string, token: string): ApiClient {
  const headers = { Authorization: `Bearer ${token}` };
  const json = { ...headers, 'Content-Type': 'application/json' };
  const at = (path: string): string => `${baseUrl}/api/v1${path}`;
  const client: ApiClient = {
    get: async (path) => bodyOf(await fetch(at(path), { headers })),
    post: async (path, body) => bodyOf(await fetch(at(path), { method: 'POST', headers: json, body: JSON.stringify(body) })),
    patch: async (path, body) => bodyOf(await fetch(at(path), { method: 'PATCH', headers: json, body: JSON.stringify(body) })),
    upload: async (sessionId, parts) => bodyOf(await fetch(at(`/sessions/${sessionId}/files`), { method: 'POST', headers, body: uploadForm(parts) })),
    settled: async (sessionId, longestMs = 60_000) => {
      const until = Date.now() + longestMs;
      for (;;) {
        const session = await client.get<SessionBody>(`/sessions/${sessionId}`);
        if (session.progress.waiting + session.progress.reading + session.progress.curvesPending === 0) return session;
        if (Date.now() > until) throw new Error(`The session has not settled: ${JSON.stringify(session.progress)}`);
        await rest(100);
      }
    },
  };
  return client;
}
