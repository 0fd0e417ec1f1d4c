import { changeTrace as changeTraceCall, getTracePoints, listTraces as listTracesCall, type Trace } from '@leeside/contracts/traces';
import { recordAudit } from '@leeside/database/audit-store';
import { markCurvesPending } from '@leeside/database/mark-curves-pending';
import { inTransaction } from '@leeside/database/open-database';
import { belongsToLab } from '@leeside/database/sample-store';
import { sessionExists } from '@leeside/database/session-store';
import { readTracePoints } from '@leeside/database/sweep-store';
import { changeTrace, findTrace, listTraces, type KeptTrace } from '@leeside/database/trace-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { packPoints, wantsBinary } from '../../http/binary-points.js';
import { HttpProblem, notFound, unknownReference } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

function shown({ uploadOrder: _order, ...trace }: KeptTrace): Trace {
  return trace;
}
const tagOf = ({ version }: Pick<Trace, 'version'>): string => `"${version}"`;
const stale = (): HttpProblem => new HttpProblem(412, 'stale', 'Somebody was faster', 'The trace was changed since it was read. Read it again and decide anew.');

/** Curves that a change concerns: the trace's own before and after, all where it is or becomes something that others use. */
function affectedBy(before: KeptTrace, after: KeptTrace): { sampleIds: string[]; traceIds: string[] } | null {
  if ([before, after].some(({ role }) => role !== 'enclosed' && role !== null)) return null;
  return { sampleIds: [before, after].flatMap(({ sampleId }) => sampleId ?? []), traceIds: [before.id] };
}

export function mountTraces(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, listTracesCall, async ({ params, principal: { labId } }) => {
    if (!(await sessionExists(db, labId, params.id))) throw notFound();
    return { status: 200, body: { items: (await listTraces(db, labId, params.id)).map(shown) } };
  });
  mountEndpoint(router, tools, changeTraceCall, async ({ params, body, request, principal: { labId, personId } }) => {
    if (body.sampleId && !(await belongsToLab(db, 'samples', labId, body.sampleId))) throw unknownReference('/sampleId', 'sample');
    const changed = await inTransaction(db, async (trx) => {
      const before = await findTrace(trx, labId, params.id);
      if (before === null) throw notFound();
      if (body.pairedWith) {
        const reference = await findTrace(trx, labId, body.pairedWith);
        if (reference === null || reference.sessionId !== before.sessionId) throw unknownReference('/pairedWith', 'trace in this session');
      }
      const wanted = request.get('If-Match');
      if (wanted !== undefined && wanted !== '*' && wanted !== tagOf(before)) throw stale();
      if (!(await changeTrace(trx, labId, before, body))) throw stale();
      const after = await findTrace(trx, labId, params.id);
      if (after === null) throw notFound();
      await markCurvesPending(trx, { labId, sessionId: before.sessionId }, affectedBy(before, after));
      await recordAudit(trx, { labId, personId, action: 'trace-changed', subjectKind: 'trace', subjectId: params.id, details: { change: body } });
      return after;
    });
    return { status: 200, body: shown(changed), headers: { ETag: tagOf(changed) } };
  });
  mountEndpoint(router, tools, getTracePoints, async ({ params, query, request, response, principal: { labId } }) => {
    const points = await readTracePoints(db, labId, params.id, query);
    if (points === null) throw notFound();
    response.vary('Accept');
    if (!wantsBinary(request)) return { status: 200, body: { frequencyHz: [...points.frequencyHz], level: [...points.level] } };
    response.status(200).set('Cache-Control', 'no-store').type('application/octet-stream').send(packPoints(points.frequencyHz, [points.level]));
    return undefined;
  });
}
