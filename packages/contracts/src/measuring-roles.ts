import { z } from 'zod';

/** What a sweep is in its session. */
export const measuringRoles = ['reference', 'enclosed', 'noise', 'leakage', 'ambient'] as const;
export const measuringRoleSchema = z.enum(measuringRoles);
export type MeasuringRole = z.infer<typeof measuringRoleSchema>;

/** How a lab sweeps: one carrier, several, or signal in every bin. */
export const sweepStyles = ['spot', 'comb', 'continuous'] as const;
export const sweepStyleSchema = z.enum(sweepStyles);
