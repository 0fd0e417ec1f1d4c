import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { dateSchema, idParamsSchema, idSchema, noteSchema, pageOf, pageQuerySchema, shortTextSchema, timeSchema } from './field-schemas.js';
import { fileStates } from './file-states.js';

export const progressSchema = z.object({
  waiting: z.number().int(), reading: z.number().int(), read: z.number().int(), needsAnswer: z.number().int(),
  refused: z.number().int(), curvesPending: z.number().int(), curvesReady: z.number().int(),
});
export type SessionProgress = z.infer<typeof progressSchema>;

const sessionFields = {
  id: idSchema, title: z.string(), heldOn: dateSchema, impedanceOhm: z.number(), requirementId: idSchema.nullable(),
  requirementName: z.string().nullable(), floorMarginDb: z.number(), notes: z.string().nullable(),
  createdAt: timeSchema, createdByName: z.string(),
};
export const sessionSummarySchema = z.object({ ...sessionFields, progress: progressSchema });
export type SessionSummary = z.infer<typeof sessionSummarySchema>;

export const sessionSchema = z.object({
  ...sessionFields,
  files: z.array(z.object({ id: idSchema, name: z.string(), state: z.enum(fileStates), setAsideAt: timeSchema.nullable() })),
  progress: progressSchema,
});
export type Session = z.infer<typeof sessionSchema>;

export const createSession = endpoint({
  name: 'createSession', method: 'post', path: '/sessions', summary: 'Open a session at the bench', access: 'session.edit',
  body: z.strictObject({
    title: shortTextSchema, heldOn: dateSchema, impedanceOhm: z.number().positive().max(10_000).optional(),
    requirementId: idSchema.optional(), floorMarginDb: z.union([z.literal(3), z.literal(6), z.literal(10)]).optional(), notes: noteSchema.optional(),
  }),
  answers: { 201: sessionSchema },
});
export const listSessions = endpoint({
  name: 'listSessions', method: 'get', path: '/sessions', summary: 'Sessions, the latest bench day first', access: 'lab.read',
  query: pageQuerySchema, answers: { 200: pageOf(sessionSummarySchema) },
});
export const getSession = endpoint({
  name: 'getSession', method: 'get', path: '/sessions/{id}', summary: 'One session with its files and how far it is', access: 'lab.read',
  params: idParamsSchema, answers: { 200: sessionSchema },
});
export const streamSessionEvents = endpoint({
  name: 'streamSessionEvents', method: 'get', path: '/sessions/{id}/events', summary: 'Server-sent events: file, curve, progress', access: 'lab.read',
  params: idParamsSchema, answers: { 200: null }, answerType: 'text/event-stream',
});
