import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { dateSchema, idSchema } from './field-schemas.js';

const fileWaitingSchema = z.object({ fileId: idSchema, name: z.string(), sessionId: idSchema, sessionTitle: z.string(), reason: z.string() });

/** What waits for the person who is signed in. */
export const todaySchema = z.object({
  filesNeedingAnswer: z.array(fileWaitingSchema), filesRefused: z.array(fileWaitingSchema),
  samplesOnTheBench: z.array(z.object({ id: idSchema, code: z.string(), name: z.string() })),
  guessedTraces: z.array(z.object({ sessionId: idSchema, sessionTitle: z.string(), count: z.number().int() })),
  curvesInDoubt: z.array(z.object({ curveId: idSchema, sessionTitle: z.string(), sampleCode: z.string().nullable(), doubt: z.string() })),
  recentSessions: z.array(z.object({ id: idSchema, title: z.string(), heldOn: dateSchema })),
});
export type Today = z.infer<typeof todaySchema>;

export const getToday = endpoint({
  name: 'getToday', method: 'get', path: '/today', summary: 'What waits for me', access: 'lab.read', answers: { 200: todaySchema },
});
