import { z } from 'zod';

/** The five roles of a lab. One person may hold several; `client` excludes all others. */
export const roles = ['engineer', 'analyst', 'qa', 'admin', 'client'] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;
