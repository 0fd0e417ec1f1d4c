import { z } from 'zod';
import { curveStates } from './curves.js';
import { idSchema } from './field-schemas.js';
import { fileStates } from './file-states.js';
import { progressSchema } from './sessions.js';

/** What a session's event stream carries; `event:` is the kind. A lost event is made good by asking again. */
export const sessionEventSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('file'), id: idSchema, name: z.string(), state: z.enum(fileStates) }),
  z.object({ kind: z.literal('curve'), id: idSchema, state: z.enum(curveStates) }),
  z.object({ kind: z.literal('progress'), progress: progressSchema }),
]);
export type SessionEvent = z.infer<typeof sessionEventSchema>;
