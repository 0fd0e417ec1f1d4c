import { uploadFiles } from '@leeside/contracts/files';
import { recordAudit } from '@leeside/database/audit-store';
import { insertFiles, type KeptFile } from '@leeside/database/file-store';
import { inTransaction, type Database } from '@leeside/database/open-database';
import { belongsToLab } from '@leeside/database/sample-store';
import { sessionExists } from '@leeside/database/session-store';
import { rawFileKey } from '@leeside/object-store/object-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { notFound, unknownReference } from '../../http/http-problem.js';
import { answerOnce } from '../../http/idempotency.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';
import type { Principal } from '../../http/principal.js';
import { receiveFiles, type ArrivedFile } from '../../http/upload-form.js';

async function checkSamples({ db }: ApiTools, labId: string, files: readonly ArrivedFile[]): Promise<void> {
  for (const sampleId of new Set(files.flatMap(({ fields }) => fields.sampleId ?? []))) {
    if (!(await belongsToLab(db, 'samples', labId, sampleId))) throw unknownReference('/sampleId', 'sample');
  }
}

/** All rows of a request in the caller's transaction; the bytes are kept before: a row without bytes cannot be, bytes without a row are swept. */
async function keepRows(trx: Database, { labId, personId }: Principal, sessionId: string, files: readonly ArrivedFile[]): Promise<KeptFile[]> {
  const kept = await insertFiles(trx, { labId, sessionId }, personId, files.map(({ name, object, fields }) => ({ name, sha256: object.sha256, byteCount: object.byteCount, fields })));
  await recordAudit(trx, { labId, personId, action: 'files-uploaded', subjectKind: 'session', subjectId: sessionId, details: { files: kept.map(({ id, sha256 }) => ({ id, sha256 })) } });
  return kept;
}

export function mountUpload(router: Router, tools: ApiTools): void {
  mountEndpoint(router, tools, uploadFiles, async ({ params, principal, request }) => {
    if (!(await sessionExists(tools.db, principal.labId, params.id))) throw notFound();
    const files = await receiveFiles(request, tools.store);
    try {
      await checkSamples(tools, principal.labId, files);
      const payload = files.map(({ name, object, fields }) => [name, object.sha256, fields]);
      for (const { object } of files) await tools.store.keep(object, rawFileKey(principal.labId, object.sha256));
      return await inTransaction(tools.db, (trx) => answerOnce(trx, { principal, request, payload }, async () => {
        const items = await keepRows(trx, principal, params.id, files);
        return { status: 202, body: { items }, headers: { Location: `/api/v1/sessions/${params.id}` } };
      }));
    } finally {
      await Promise.all(files.map(({ object }) => tools.store.discard(object)));
    }
  });
}
