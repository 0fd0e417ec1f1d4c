import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { frequencyHzSchema, idParamsSchema, idSchema, levelSchema, listOf, timeSchema } from './field-schemas.js';
import { measuringRoleSchema } from './measuring-roles.js';

export const typedLevelSchema = z.object({
  id: idSchema, role: measuringRoleSchema, sampleId: idSchema.nullable(), condition: z.string(), frequencyHz: z.number(),
  levelDbm: z.number(), inTheNoise: z.boolean(), enteredAt: timeSchema,
});
export type TypedLevelBody = z.infer<typeof typedLevelSchema>;

export const addLevels = endpoint({
  name: 'addLevels', method: 'post', path: '/sessions/{id}/levels', summary: 'Type levels read off the screen', access: 'level.type',
  params: idParamsSchema,
  body: z.strictObject({
    items: z.array(z.strictObject({
      role: measuringRoleSchema, sampleId: idSchema.optional(), condition: z.string().trim().max(200).optional(),
      frequencyHz: frequencyHzSchema, levelDbm: levelSchema, inTheNoise: z.boolean().optional(),
    })).min(1).max(5000),
  }),
  answers: { 201: listOf(typedLevelSchema) },
});
export const listLevels = endpoint({
  name: 'listLevels', method: 'get', path: '/sessions/{id}/levels', summary: 'The typed levels of a session', access: 'lab.read',
  params: idParamsSchema, answers: { 200: listOf(typedLevelSchema) },
});
export const removeLevel = endpoint({
  name: 'removeLevel', method: 'delete', path: '/levels/{id}', summary: 'Take a typed level out', access: 'level.type',
  params: idParamsSchema, answers: { 204: null },
});
