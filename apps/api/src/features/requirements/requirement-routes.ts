import { createRequirement as createRequirementCall, getRequirement, listRequirements as listRequirementsCall } from '@leeside/contracts/requirements';
import { recordAudit } from '@leeside/database/audit-store';
import { inTransaction } from '@leeside/database/open-database';
import { createRequirement, findRequirement, listRequirements } from '@leeside/database/requirement-store';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { notFound } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

export function mountRequirements(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, createRequirementCall, async ({ body, principal: { labId, personId } }) => {
    const id = await inTransaction(db, async (trx) => {
      const made = await createRequirement(trx, labId, body);
      await recordAudit(trx, { labId, personId, action: 'requirement-made', subjectKind: 'requirement', subjectId: made, details: { name: body.name } });
      return made;
    });
    return { status: 201, body: await findRequirement(db, labId, id), headers: { Location: `/api/v1/requirements/${id}` } };
  });
  mountEndpoint(router, tools, listRequirementsCall, async ({ query, principal }) => ({ status: 200, body: await listRequirements(db, principal.labId, query) }));
  mountEndpoint(router, tools, getRequirement, async ({ params, principal }) => {
    const requirement = await findRequirement(db, principal.labId, params.id);
    if (requirement === null) throw notFound();
    return { status: 200, body: requirement };
  });
}
