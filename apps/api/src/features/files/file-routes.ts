import { answerQuestions, bringFileBack, getFile, getLimits, getRawFile, readFileAgain as readFileAgainCall, setFileAside as setFileAsideCall, uploadLimits } from '@leeside/contracts/files';
import { recordAudit } from '@leeside/database/audit-store';
import { findFile, readAnswers, readFileAgain, setFileAside } from '@leeside/database/file-store';
import { markCurvesPending } from '@leeside/database/mark-curves-pending';
import { inTransaction } from '@leeside/database/open-database';
import { rawFileKey } from '@leeside/object-store/object-store';
import { pipeline } from 'node:stream/promises';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { attachment } from '../../http/content-disposition.js';
import { conflict, HttpProblem, notFound } from '../../http/http-problem.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';
import type { Principal } from '../../http/principal.js';

async function fileOr404({ db }: ApiTools, labId: string, id: string) {
  const file = await findFile(db, labId, id);
  if (file === null) throw notFound();
  return file;
}

/** Sets a file aside or back: its curves change with it. */
async function moveAside({ db }: ApiTools, { labId, personId }: Principal, id: string, aside: boolean): Promise<void> {
  await inTransaction(db, async (trx) => {
    const sessionId = await setFileAside(trx, labId, id, aside);
    if (sessionId === null) return;
    await markCurvesPending(trx, { labId, sessionId }, null);
    await recordAudit(trx, { labId, personId, action: aside ? 'file-set-aside' : 'file-brought-back', subjectKind: 'file', subjectId: id });
  });
}

async function readOnceMore({ db }: ApiTools, { labId, personId }: Principal, id: string, answers?: readonly { questionId: string; choiceId: string }[]): Promise<void> {
  await inTransaction(db, async (trx) => {
    const given = answers && [...(await readAnswers(trx, labId, id)).filter((old) => !answers.some((fresh) => fresh.questionId === old.questionId)), ...answers];
    if ((await readFileAgain(trx, labId, id, given)) === null) throw conflict('file-under-way', 'The file is being read just now.');
    await recordAudit(trx, { labId, personId, action: answers === undefined ? 'file-read-again' : 'questions-answered', subjectKind: 'file', subjectId: id, details: answers === undefined ? {} : { answers } });
  });
}

export function mountFiles(router: Router, tools: ApiTools): void {
  mountEndpoint(router, tools, getLimits, () => Promise.resolve({ status: 200, body: uploadLimits }));
  mountEndpoint(router, tools, getFile, async ({ params, principal }) => ({ status: 200, body: await fileOr404(tools, principal.labId, params.id) }));
  mountEndpoint(router, tools, getRawFile, async ({ params, principal, response }) => {
    const file = await fileOr404(tools, principal.labId, params.id);
    const stream = await tools.store.openStream(rawFileKey(principal.labId, file.sha256));
    if (stream === null) throw new HttpProblem(404, 'object-missing', 'The stored file is missing', 'The bytes of this file are not in the store.');
    response.set({ 'Content-Type': 'application/octet-stream', 'Content-Length': String(file.bytes), 'Content-Disposition': attachment(file.name), 'Cache-Control': 'private, no-store', ETag: `"${file.sha256}"` });
    await pipeline(stream, response);
    return undefined;
  });
  mountEndpoint(router, tools, setFileAsideCall, async ({ params, principal }) => {
    await fileOr404(tools, principal.labId, params.id);
    await moveAside(tools, principal, params.id, true);
    return { status: 204 };
  });
  mountEndpoint(router, tools, bringFileBack, async ({ params, principal }) => {
    await fileOr404(tools, principal.labId, params.id);
    await moveAside(tools, principal, params.id, false);
    return { status: 200, body: await fileOr404(tools, principal.labId, params.id) };
  });
  mountEndpoint(router, tools, readFileAgainCall, async ({ params, principal }) => {
    await fileOr404(tools, principal.labId, params.id);
    await readOnceMore(tools, principal, params.id);
    return { status: 202, body: await fileOr404(tools, principal.labId, params.id), headers: { Location: `/api/v1/files/${params.id}` } };
  });
  mountEndpoint(router, tools, answerQuestions, async ({ params, body, principal }) => {
    const file = await fileOr404(tools, principal.labId, params.id);
    if (file.state !== 'needs answer') throw conflict('nothing-asked', 'This file asks nothing.');
    const unknown = body.answers.find(({ questionId, choiceId }) => !file.questions?.some((question) => question.id === questionId && question.choices.some((choice) => choice.id === choiceId)));
    if (unknown) throw new HttpProblem(422, 'unknown-choice', 'No such choice', `The file does not ask "${unknown.questionId}" with the choice "${unknown.choiceId}".`);
    await readOnceMore(tools, principal, params.id, body.answers);
    return { status: 202, body: await fileOr404(tools, principal.labId, params.id), headers: { Location: `/api/v1/files/${params.id}` } };
  });
}
