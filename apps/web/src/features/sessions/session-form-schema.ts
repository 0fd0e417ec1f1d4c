import { z } from 'zod';
import { optionalNumber } from '../../components/form/typed-quantity';

export const floorMargins = [3, 6, 10] as const;

export const sessionFormSchema = z.object({
  title: z.string().trim().min(1, 'Title is missing. Say what was measured.').max(200, 'Title is longer than 200 characters.'),
  heldOn: z.iso.date('Bench day is missing or no date.'),
  requirementId: z.string(),
  impedanceOhm: optionalNumber('Impedance', 0.001, 10_000),
  floorMarginDb: z.enum(['3', '6', '10']).transform((text) => floorMargins.find((margin) => String(margin) === text) ?? 6),
  notes: z.string().max(10_000, 'Notes are longer than 10 000 characters.'),
});

export type SessionFormInput = z.input<typeof sessionFormSchema>;

/** What the form says, as the API takes it; what was left empty is left out. */
export function sessionBody({ title, heldOn, requirementId, impedanceOhm, floorMarginDb, notes }: z.output<typeof sessionFormSchema>) {
  return {
    title, heldOn, floorMarginDb, ...(requirementId ? { requirementId } : {}),
    ...(impedanceOhm === undefined ? {} : { impedanceOhm }), ...(notes.trim() ? { notes } : {}),
  };
}
