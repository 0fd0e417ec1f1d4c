import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { frequencyHzSchema, idParamsSchema, idSchema, pageOf, pageQuerySchema, shortTextSchema, timeSchema } from './field-schemas.js';

export const decisionRules = ['simple', 'guarded'] as const;
const attenuationSchema = z.number().finite().min(0).max(300);

export const requirementSegmentSchema = z
  .strictObject({ fromHz: frequencyHzSchema, toHz: frequencyHzSchema, fromDb: attenuationSchema, toDb: attenuationSchema })
  .refine((segment) => segment.fromHz < segment.toHz, { path: ['toHz'], message: 'toHz must lie above fromHz' });

export const requirementSchema = z.object({
  id: idSchema, name: z.string(), rule: z.enum(decisionRules), guardFactor: z.number(), standsForRatio: z.number(),
  segments: z.array(z.object({ fromHz: z.number(), toHz: z.number(), fromDb: z.number(), toDb: z.number() })), createdAt: timeSchema,
});
export type Requirement = z.infer<typeof requirementSchema>;

/** Segments run upwards and never overlap; they may touch. */
const segmentsSchema = z.array(requirementSegmentSchema).min(1).max(100).refine(
  (segments) => segments.every((segment, at) => at === 0 || segment.fromHz >= (segments[at - 1]?.toHz ?? 0)),
  { message: 'segments must run upwards in frequency without overlap' },
);

export const createRequirement = endpoint({
  name: 'createRequirement', method: 'post', path: '/requirements', summary: 'State what attenuation is required', access: 'requirement.edit',
  body: z.strictObject({
    name: shortTextSchema, rule: z.enum(decisionRules), guardFactor: z.number().positive().max(3).optional(),
    standsForRatio: z.number().min(1).max(10).optional(), segments: segmentsSchema,
  }),
  answers: { 201: requirementSchema },
});
export const listRequirements = endpoint({
  name: 'listRequirements', method: 'get', path: '/requirements', summary: 'Requirements by name', access: 'lab.read',
  query: pageQuerySchema, answers: { 200: pageOf(requirementSchema) },
});
export const getRequirement = endpoint({
  name: 'getRequirement', method: 'get', path: '/requirements/{id}', summary: 'One requirement', access: 'lab.read',
  params: idParamsSchema, answers: { 200: requirementSchema },
});
