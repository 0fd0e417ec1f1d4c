import { z } from 'zod';
import { curveSummarySchema } from './curves.js';
import { endpoint } from './endpoint.js';
import { idParamsSchema, idSchema, listOf, noteSchema, pageOf, pageQuerySchema, shortTextSchema, timeSchema } from './field-schemas.js';

export const sampleStates = ['received', 'on the bench', 'measured', 'released', 'held', 'returned'] as const;

export const sampleSchema = z.object({
  id: idSchema, code: z.string(), name: z.string(), state: z.enum(sampleStates),
  lotId: idSchema.nullable(), lotCode: z.string().nullable(), designId: idSchema.nullable(), designName: z.string().nullable(),
  clientId: idSchema.nullable(), clientName: z.string().nullable(),
  insideSizeM: z.array(z.number()).length(3).nullable(), notes: z.string().nullable(), createdAt: timeSchema,
});
export type Sample = z.infer<typeof sampleSchema>;

export const createSample = endpoint({
  name: 'createSample', method: 'post', path: '/samples', summary: 'Take a sample in', access: 'intake.edit',
  body: z.strictObject({
    code: shortTextSchema, name: shortTextSchema, lotId: idSchema.optional(), designId: idSchema.optional(),
    clientId: idSchema.optional(), insideSizeM: z.array(z.number().positive().max(100)).length(3).optional(), notes: noteSchema.optional(),
  }),
  answers: { 201: sampleSchema },
});
export const listSamples = endpoint({
  name: 'listSamples', method: 'get', path: '/samples', summary: 'Samples, newest first', access: ['lab.read', 'own-sample.read'],
  query: pageQuerySchema.extend({ code: z.string().max(200).optional() }), answers: { 200: pageOf(sampleSchema) },
});
export const getSample = endpoint({
  name: 'getSample', method: 'get', path: '/samples/{id}', summary: 'One sample', access: ['lab.read', 'own-sample.read'],
  params: idParamsSchema, answers: { 200: sampleSchema },
});
export const listSampleCurves = endpoint({
  name: 'listSampleCurves', method: 'get', path: '/samples/{id}/curves', summary: 'The curves of a sample, the latest session first', access: 'lab.read',
  params: idParamsSchema, answers: { 200: listOf(curveSummarySchema) },
});
