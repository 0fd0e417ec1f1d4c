import { listClients as listClientsCall, listDesigns as listDesignsCall, listLots as listLotsCall } from '@leeside/contracts/intake';
import { createSample as createSampleCall, getSample, listSampleCurves, listSamples as listSamplesCall } from '@leeside/contracts/samples';
import { recordAudit } from '@leeside/database/audit-store';
import { listCurvesOfSample } from '@leeside/database/curve-read-model';
import { listClients, listDesigns, listLots } from '@leeside/database/intake-store';
import { inTransaction } from '@leeside/database/open-database';
import { belongsToLab, createSample, findSample, listSamples } from '@leeside/database/sample-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { conflict, notFound, unknownReference } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

const references = [['lotId', 'lots', 'lot'], ['designId', 'designs', 'design'], ['clientId', 'clients', 'client']] as const;

export function mountIntake(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, createSampleCall, async ({ body, principal: { labId, personId } }) => {
    for (const [field, table, what] of references) {
      const id = body[field];
      if (id !== undefined && !(await belongsToLab(db, table, labId, id))) throw unknownReference(`/${field}`, what);
    }
    const id = await inTransaction(db, async (trx) => {
      const made = await createSample(trx, labId, body);
      if (made === null) throw conflict('code-taken', `The code ${body.code} belongs to another sample.`);
      await recordAudit(trx, { labId, personId, action: 'sample-received', subjectKind: 'sample', subjectId: made, details: { code: body.code } });
      return made;
    });
    return { status: 201, body: await findSample(db, { labId, clientId: null }, id), headers: { Location: `/api/v1/samples/${id}` } };
  });
  mountEndpoint(router, tools, listSamplesCall, async ({ query, principal }) => ({ status: 200, body: await listSamples(db, principal, query) }));
  mountEndpoint(router, tools, getSample, async ({ params, principal }) => {
    const sample = await findSample(db, principal, params.id);
    if (sample === null) throw notFound();
    return { status: 200, body: sample };
  });
  mountEndpoint(router, tools, listSampleCurves, async ({ params, principal: { labId } }) => {
    if ((await findSample(db, { labId, clientId: null }, params.id)) === null) throw notFound();
    return { status: 200, body: { items: await listCurvesOfSample(db, labId, params.id) } };
  });
  mountEndpoint(router, tools, listClientsCall, async ({ principal }) => ({ status: 200, body: { items: await listClients(db, principal.labId) } }));
  mountEndpoint(router, tools, listDesignsCall, async ({ principal }) => ({ status: 200, body: { items: await listDesigns(db, principal.labId) } }));
  mountEndpoint(router, tools, listLotsCall, async ({ principal }) => ({ status: 200, body: { items: await listLots(db, principal.labId) } }));
}
