import { addLevels, listLevels as listLevelsCall, removeLevel } from '@leeside/contracts/levels';
import { recordAudit } from '@leeside/database/audit-store';
import { deleteLevel, insertLevels, listLevels, type KeptLevel } from '@leeside/database/level-store';
import { markCurvesPending } from '@leeside/database/mark-curves-pending';
import { inTransaction } from '@leeside/database/open-database';
import { belongsToLab } from '@leeside/database/sample-store';
import { sessionExists } from '@leeside/database/session-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { notFound, unknownReference } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

const shown = ({ order: _order, ...level }: KeptLevel): Omit<KeptLevel, 'order'> => level;

export function mountLevels(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, addLevels, async ({ params, body, principal: { labId, personId } }) => {
    if (!(await sessionExists(db, labId, params.id))) throw notFound();
    for (const [at, { sampleId }] of body.items.entries()) if (sampleId !== undefined && !(await belongsToLab(db, 'samples', labId, sampleId))) throw unknownReference(`/items/${at}/sampleId`, 'sample');
    const levels = await inTransaction(db, async (trx) => {
      const kept = await insertLevels(trx, { labId, sessionId: params.id, personId }, body.items);
      await markCurvesPending(trx, { labId, sessionId: params.id }, null);
      await recordAudit(trx, { labId, personId, action: 'levels-typed', subjectKind: 'session', subjectId: params.id, details: { levels: kept.map(({ id }) => id) } });
      return kept;
    });
    return { status: 201, body: { items: levels.map(shown) } };
  });
  mountEndpoint(router, tools, listLevelsCall, async ({ params, principal: { labId } }) => {
    if (!(await sessionExists(db, labId, params.id))) throw notFound();
    return { status: 200, body: { items: (await listLevels(db, labId, params.id)).map(shown) } };
  });
  mountEndpoint(router, tools, removeLevel, async ({ params, principal: { labId, personId } }) => {
    await inTransaction(db, async (trx) => {
      const sessionId = await deleteLevel(trx, labId, params.id);
      if (sessionId === null) throw notFound();
      await markCurvesPending(trx, { labId, sessionId }, null);
      await recordAudit(trx, { labId, personId, action: 'level-taken-out', subjectKind: 'session', subjectId: sessionId, details: { level: params.id } });
    });
    return { status: 204 };
  });
}
