import { z } from 'zod';

/** Analyzer settings of a sweep as far as they are known; an absent one is unknown. */
export const sweepSettingsSchema = z.object({
  rbwHz: z.number().optional(), vbwHz: z.number().optional(),
  detector: z.enum(['peak', 'negative peak', 'sample', 'rms', 'average', 'quasi-peak', 'auto']).optional(),
  traceMode: z.enum(['clear write', 'max hold', 'min hold', 'average', 'view']).optional(),
  averaging: z.enum(['power', 'voltage', 'log']).optional(),
  held: z.number().optional(), attenuationDb: z.number().optional(), preamplifier: z.boolean().optional(),
  referenceLevelDbm: z.number().optional(), sweepTimeS: z.number().optional(), impedanceOhm: z.number().optional(),
  correctionsApplied: z.boolean().optional(), instrument: z.string().optional(), serial: z.string().optional(),
});
export type SweepSettingsBody = z.infer<typeof sweepSettingsSchema>;
