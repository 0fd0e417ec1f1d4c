import { getCurve, getCurveCsv, getCurveLevels, getCurvePoints, listCurves as listCurvesCall } from '@leeside/contracts/curves';
import { readCurveLevelUnit, readCurvePoints } from '@leeside/database/curve-points-read-model';
import { findCurve, listCurves } from '@leeside/database/curve-read-model';
import type { CurveColumns } from '@leeside/database/curve-result-store';
import { sessionExists } from '@leeside/database/session-store';
import type { Request, Response, Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { packPoints, wantsBinary } from '../../http/binary-points.js';
import { attachment } from '../../http/content-disposition.js';
import { cleanFileName } from '../../http/clean-file-name.js';
import { notFound } from '../../http/http-problem.js';
import type { Answer } from '../../http/answer.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';
import { curveCsv } from './curve-csv.js';

const orNull = (values: Float32Array): (number | null)[] => Array.from(values, (value) => (Number.isNaN(value) ? null : value));

function answerPoints(request: Request, response: Response, json: unknown, binary: { frequencyHz: Float64Array; columns: readonly ArrayLike<number>[] }): Answer | undefined {
  response.vary('Accept');
  if (!wantsBinary(request)) return { status: 200, body: json };
  response.status(200).set('Cache-Control', 'no-store').type('application/octet-stream').send(packPoints(binary.frequencyHz, binary.columns));
  return undefined;
}

async function pointsOr404({ db }: ApiTools, labId: string, id: string, window: Parameters<typeof readCurvePoints>[3]): Promise<CurveColumns> {
  const points = await readCurvePoints(db, labId, id, window);
  if (points === null) throw notFound();
  return points;
}

export function mountCurves(router: Router, tools: ApiTools): void {
  const { db } = tools;
  mountEndpoint(router, tools, listCurvesCall, async ({ params, principal: { labId } }) => {
    if (!(await sessionExists(db, labId, params.id))) throw notFound();
    return { status: 200, body: { items: await listCurves(db, labId, params.id) } };
  });
  mountEndpoint(router, tools, getCurveCsv, async ({ params, response, principal: { labId } }) => {
    const curve = await findCurve(db, labId, params.id);
    if (curve === null) throw notFound();
    const points = await pointsOr404(tools, labId, params.id, {});
    const { name } = cleanFileName(`curve ${curve.sampleCode ?? 'without sample'} ${curve.condition} revision ${curve.revision}.csv`.replaceAll(/\s+/g, '-'));
    response.status(200).set({ 'Content-Type': 'text/csv; charset=utf-8', 'Content-Disposition': attachment(name), 'Cache-Control': 'no-store' }).send(curveCsv(points));
    return undefined;
  });
  mountEndpoint(router, tools, getCurve, async ({ params, principal: { labId } }) => {
    const curve = await findCurve(db, labId, params.id);
    if (curve === null) throw notFound();
    return { status: 200, body: curve };
  });
  mountEndpoint(router, tools, getCurvePoints, async ({ params, query, request, response, principal: { labId } }) => {
    const points = await pointsOr404(tools, labId, params.id, query);
    const { frequencyHz, attenuationDb, atLeast, atMostDb, ceilingDb, expandedUncertaintyDb, requiredDb } = points;
    const json = {
      frequencyHz: [...frequencyHz], attenuationDb: [...attenuationDb], atLeast: Array.from(atLeast, (flag) => flag === 1), atMostDb: orNull(atMostDb), ceilingDb: orNull(ceilingDb),
      expandedUncertaintyDb: orNull(expandedUncertaintyDb), requiredDb: orNull(requiredDb),
    };
    return answerPoints(request, response, json, { frequencyHz, columns: [attenuationDb, atLeast, atMostDb, ceilingDb, expandedUncertaintyDb, requiredDb] });
  });
  mountEndpoint(router, tools, getCurveLevels, async ({ params, query, request, response, principal: { labId } }) => {
    const { frequencyHz, referenceLevel, enclosedLevel, floorLevel } = await pointsOr404(tools, labId, params.id, query);
    const levelUnit = await readCurveLevelUnit(db, labId, params.id);
    const json = { frequencyHz: [...frequencyHz], referenceLevel: orNull(referenceLevel), enclosedLevel: orNull(enclosedLevel), floorLevel: orNull(floorLevel), levelUnit };
    return answerPoints(request, response, json, { frequencyHz, columns: [referenceLevel, enclosedLevel, floorLevel] });
  });
}
