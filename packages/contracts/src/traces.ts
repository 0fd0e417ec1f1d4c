import { keptLevelUnits } from '@leeside/units/level-unit';
import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { frequencyHzSchema, idParamsSchema, idSchema, listOf, timeSchema } from './field-schemas.js';
import { measuringRoleSchema, sweepStyleSchema } from './measuring-roles.js';
import { sweepSettingsSchema } from './sweep-settings.js';

export const traceSchema = z.object({
  id: idSchema, sessionId: idSchema, fileId: idSchema, name: z.string(), fileName: z.string(),
  role: measuringRoleSchema.nullable(), roleGuessed: z.boolean(), sampleId: idSchema.nullable(), sampleGuessed: z.boolean(),
  condition: z.string(), polarisation: z.string(), position: z.string(), measuredAt: timeSchema.nullable(),
  chainLossDb: z.number().nullable(), transmitLevelDbm: z.number().nullable(), pairedWith: idSchema.nullable(),
  pointCount: z.number().int(), startHz: z.number(), stopHz: z.number(), levelUnit: z.enum(keptLevelUnits), settings: sweepSettingsSchema,
  peak: z.object({ frequencyHz: z.number(), level: z.number() }), style: sweepStyleSchema.optional(), setAside: z.string().optional(), version: z.number().int(),
});
export type Trace = z.infer<typeof traceSchema>;

export const listTraces = endpoint({
  name: 'listTraces', method: 'get', path: '/sessions/{id}/traces', summary: 'The traces of a session', access: 'lab.read',
  params: idParamsSchema, answers: { 200: listOf(traceSchema) },
});
export const changeTrace = endpoint({
  name: 'changeTrace', method: 'patch', path: '/traces/{id}', summary: 'Say what a trace is', access: 'trace.edit',
  params: idParamsSchema,
  body: z.strictObject({
    role: measuringRoleSchema.optional(), sampleId: idSchema.nullable().optional(), condition: z.string().trim().max(200).optional(),
    polarisation: z.string().trim().max(50).optional(), position: z.string().trim().max(50).optional(), measuredAt: timeSchema.nullable().optional(),
    chainLossDb: z.number().min(-200).max(200).nullable().optional(), transmitLevelDbm: z.number().min(-200).max(100).nullable().optional(),
    pairedWith: idSchema.nullable().optional(), setAside: z.string().trim().min(1).max(500).nullable().optional(),
  }),
  answers: { 200: traceSchema },
});

export const pointsQuerySchema = z.strictObject({
  fromHz: z.coerce.number().finite().min(0).optional(), toHz: z.coerce.number().finite().positive().optional(),
  maxPoints: z.coerce.number().int().min(2).max(200_000).optional(),
});
export const getTracePoints = endpoint({
  name: 'getTracePoints', method: 'get', path: '/traces/{id}/points', summary: 'Levels of a trace; with maxPoints minimum and maximum per column', access: 'lab.read',
  params: idParamsSchema, query: pointsQuerySchema,
  answers: { 200: z.object({ frequencyHz: z.array(frequencyHzSchema), level: z.array(z.number()) }) },
});
