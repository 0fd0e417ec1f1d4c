import { z } from 'zod';

/** Building blocks that every request and answer shares. */
export const idSchema = z.uuid();
export const timeSchema = z.iso.datetime({ offset: true });
export const dateSchema = z.iso.date();
export const sha256Schema = z.string().regex(/^[0-9a-f]{64}$/);
export const frequencyHzSchema = z.number().finite().positive().max(1e13);
export const levelSchema = z.number().finite().min(-400).max(400);
export const shortTextSchema = z.string().trim().min(1).max(200);
export const noteSchema = z.string().max(10_000);
export const idParamsSchema = z.strictObject({ id: idSchema });

/** A page of a list: `next` is the cursor of the following page, null on the last one. */
export const pageOf = <Item extends z.ZodType>(item: Item) => z.object({ items: z.array(item), next: z.string().nullable() });

/** A list that is always answered whole. */
export const listOf = <Item extends z.ZodType>(item: Item) => z.object({ items: z.array(item) });

/** Query of every paged list. */
export const pageQuerySchema = z.strictObject({
  cursor: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

export const doubtSchema = z.object({
  code: z.string(),
  weight: z.enum(['note', 'doubt', 'stops signing']),
  message: z.string(),
  line: z.number().int().optional(),
});
export type DoubtBody = z.infer<typeof doubtSchema>;
