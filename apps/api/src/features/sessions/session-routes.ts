import { createSession as createSessionCall, getSession, listSessions as listSessionsCall, streamSessionEvents } from '@leeside/contracts/sessions';
import { recordAudit } from '@leeside/database/audit-store';
import { inTransaction } from '@leeside/database/open-database';
import { belongsToLab } from '@leeside/database/sample-store';
import { createSession, findSession, listSessions, readProgress, sessionExists } from '@leeside/database/session-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { openEventStream } from '../../http/event-stream.js';
import { notFound, unknownReference } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

export function mountSessions(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, createSessionCall, async ({ body, principal: { labId, personId } }) => {
    if (body.requirementId !== undefined && !(await belongsToLab(db, 'requirements', labId, body.requirementId))) throw unknownReference('/requirementId', 'requirement');
    const id = await inTransaction(db, async (trx) => {
      const made = await createSession(trx, { labId, personId }, body);
      await recordAudit(trx, { labId, personId, action: 'session-opened', subjectKind: 'session', subjectId: made, details: { title: body.title } });
      return made;
    });
    return { status: 201, body: await findSession(db, labId, id), headers: { Location: `/api/v1/sessions/${id}` } };
  });
  mountEndpoint(router, tools, listSessionsCall, async ({ query, principal }) => ({ status: 200, body: await listSessions(db, principal.labId, query) }));
  mountEndpoint(router, tools, getSession, async ({ params, principal }) => {
    const session = await findSession(db, principal.labId, params.id);
    if (session === null) throw notFound();
    return { status: 200, body: session };
  });
  mountEndpoint(router, tools, streamSessionEvents, async ({ params, principal, response }) => {
    if (!(await sessionExists(db, principal.labId, params.id))) throw notFound();
    const stream = openEventStream(response);
    const unwatch = await tools.events.watch(params.id, (event) => stream.send(event.kind, event)).catch(() => null);
    stream.onClose(() => unwatch?.());
    const progress = await readProgress(db, params.id);
    if (progress !== null) stream.send('progress', { kind: 'progress', progress });
    return undefined;
  });
}
