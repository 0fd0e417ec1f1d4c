import { uploadFiles as uploadEndpoint, type UploadFieldName } from '@leeside/contracts/files';
import { nothingCameBack, problemFrom } from './api-problem';
import { csrfToken } from './csrf-token';
import type { EndpointAnswer } from './endpoint-input';
import { endpointUrl } from './endpoint-url';
import { renewSession, tokenWasRenewed } from './renew-session';

export type UploadFieldTexts = Partial<Record<UploadFieldName, string>>;
export type UploadedFiles = EndpointAnswer<typeof uploadEndpoint>;
export interface UploadRequest { sessionId: string; files: readonly File[]; fields: UploadFieldTexts; onSent: (sentBytes: number) => void }

/** Fields stand before the files that they describe. */
export function uploadForm(files: readonly File[], fields: UploadFieldTexts): FormData {
  const form = new FormData();
  for (const [name, text] of Object.entries(fields)) if (text) form.append(name, text);
  for (const file of files) form.append('file', file, file.name);
  return form;
}

interface RawAnswer { status: number; text: string }

const post = (request: UploadRequest): Promise<RawAnswer> =>
  new Promise((resolve, reject) => {
    const xhr = new XMLHttpRequest();
    xhr.open('POST', endpointUrl(uploadEndpoint, { params: { id: request.sessionId } }));
    xhr.setRequestHeader('Accept', 'application/json');
    const token = csrfToken.get();
    if (token) xhr.setRequestHeader('X-CSRF-Token', token);
    xhr.upload.addEventListener('progress', (event) => request.onSent(event.loaded));
    xhr.addEventListener('load', () => resolve({ status: xhr.status, text: xhr.responseText }));
    for (const name of ['error', 'abort', 'timeout']) xhr.addEventListener(name, () => reject(nothingCameBack()));
    xhr.send(uploadForm(request.files, request.fields));
  });

/** Sends files in one request, with progress, which fetch cannot tell. */
export async function uploadFiles(request: UploadRequest): Promise<UploadedFiles> {
  let answer = await post(request);
  const mayGoNow = (answer.status === 401 && (await renewSession())) || (answer.status === 403 && (await tokenWasRenewed()));
  if (mayGoNow) answer = await post(request);
  if (answer.status !== 202) throw problemFrom(answer.status, answer.text);
  return uploadEndpoint.answers[202].parse(JSON.parse(answer.text));
}
