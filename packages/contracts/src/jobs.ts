import { z } from 'zod';
import { idSchema } from './field-schemas.js';

/** Jobs carry ids only; the truth is in the database. Up to 50 files a job; states and retries stay per file. */
export const filesPerJob = 50;
export const readFilesJobSchema = z.object({ labId: idSchema, sessionId: idSchema, fileIds: z.array(idSchema).min(1).max(filesPerJob) });
export type ReadFilesJob = z.infer<typeof readFilesJobSchema>;

/** Computes every pending curve of a session. */
export const computeCurvesJobSchema = z.object({ labId: idSchema, sessionId: idSchema });
export type ComputeCurvesJob = z.infer<typeof computeCurvesJobSchema>;

export const jobKinds = ['read-files', 'compute-curves'] as const;
export type JobKind = (typeof jobKinds)[number];
