import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { dateSchema, doubtSchema, idParamsSchema, idSchema, listOf, sha256Schema, timeSchema } from './field-schemas.js';
import { sweepStyleSchema } from './measuring-roles.js';
import { pointsQuerySchema } from './traces.js';

export const curveStates = ['pending', 'ready', 'failed'] as const;
export const outcomes = ['meets', 'falls short', 'too close to call', 'beyond reach', 'not all measured'] as const;
export const outcomeSchema = z.enum(outcomes);
export type Outcome = z.infer<typeof outcomeSchema>;

export const lowestSchema = z.object({
  frequencyHz: z.number(), attenuationDb: z.number(), atLeast: z.boolean(), atMostDb: z.number().nullable().optional(),
});
const curveFields = {
  id: idSchema, sessionId: idSchema, sessionTitle: z.string(), revision: z.number().int(), sampleId: idSchema.nullable(), sampleCode: z.string().nullable(),
  condition: z.string(), state: z.enum(curveStates), failure: z.string().nullable(), style: sweepStyleSchema.nullable(),
  pointCount: z.number().int(), outcome: outcomeSchema.nullable(), lowest: lowestSchema.nullable(), doubts: z.array(doubtSchema),
};
export const curveSummarySchema = z.object(curveFields);
export type CurveSummary = z.infer<typeof curveSummarySchema>;

export const bandSchema = z.object({
  fromHz: z.number(), toHz: z.number(), kind: z.enum(['decade', 'segment']), lowest: lowestSchema.nullable(),
  medianDb: z.number().nullable(), medianAtLeast: z.boolean(), q10Db: z.number().nullable(), q10AtLeast: z.boolean(),
  boundShare: z.number(), slopeDbPerDecade: z.number().nullable(),
});
export const gapSchema = z.object({ fromHz: z.number(), toHz: z.number(), reason: z.string() });
export const curveSchema = z.object({
  ...curveFields, heldOn: dateSchema, requirementId: idSchema.nullable(), requirementName: z.string().nullable(), decidedAtHz: z.number().nullable(),
  bands: z.array(bandSchema), notMeasured: z.array(z.object({ fromHz: z.number(), toHz: z.number() })), gaps: z.array(gapSchema),
  floorSource: z.string().nullable(), driftDb: z.number().nullable(),
  inputs: z.array(z.object({ traceId: idSchema, fileId: idSchema, sha256: sha256Schema, role: z.string().optional(), name: z.string().optional() })),
  analysisVersion: z.string().nullable(), computedAt: timeSchema.nullable(),
});
export type Curve = z.infer<typeof curveSchema>;

const numbers = z.array(z.number());
const numbersOrNull = z.array(z.number().nullable());
export const curvePointsSchema = z.object({
  frequencyHz: numbers, attenuationDb: numbers, atLeast: z.array(z.boolean()), atMostDb: numbersOrNull, ceilingDb: numbersOrNull,
  expandedUncertaintyDb: numbersOrNull, requiredDb: numbersOrNull,
});
export type CurvePointsBody = z.infer<typeof curvePointsSchema>;

/** The levels a curve came from, on its own frequency axis. */
export const curveLevelsSchema = z.object({ frequencyHz: numbers, referenceLevel: numbersOrNull, enclosedLevel: numbersOrNull, floorLevel: numbersOrNull, levelUnit: z.string() });
export type CurveLevelsBody = z.infer<typeof curveLevelsSchema>;

export const listCurves = endpoint({
  name: 'listCurves', method: 'get', path: '/sessions/{id}/curves', summary: 'The curves of a session', access: 'lab.read',
  params: idParamsSchema, answers: { 200: listOf(curveSummarySchema) },
});
export const getCurve = endpoint({
  name: 'getCurve', method: 'get', path: '/curves/{id}', summary: 'One curve with its bands, gaps and inputs', access: 'lab.read',
  params: idParamsSchema, answers: { 200: curveSchema },
});
export const getCurvePoints = endpoint({
  name: 'getCurvePoints', method: 'get', path: '/curves/{id}/points', summary: 'Points of a curve', access: 'lab.read',
  params: idParamsSchema, query: pointsQuerySchema, answers: { 200: curvePointsSchema },
});
export const getCurveLevels = endpoint({
  name: 'getCurveLevels', method: 'get', path: '/curves/{id}/levels', summary: 'Reference, enclosed and floor levels beneath a curve', access: 'lab.read',
  params: idParamsSchema, query: pointsQuerySchema, answers: { 200: curveLevelsSchema },
});
export const getCurveCsv = endpoint({
  name: 'getCurveCsv', method: 'get', path: '/curves/{id}.csv', summary: 'The exact numbers of a curve', access: 'lab.read',
  params: idParamsSchema, answers: { 200: null }, answerType: 'text/csv',
});
