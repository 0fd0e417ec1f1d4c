import { z } from 'zod';
import { optionalNumber } from '../../components/form/typed-quantity';

const sideMm = (name: string) => optionalNumber(name, 0.1, 100_000);
const millimetresPerMetre = 1000;

export const sampleFormSchema = z.object({
  code: z.string().trim().min(1, 'Code is missing. It stands on the sample.').max(200, 'Code is longer than 200 characters.'),
  name: z.string().trim().min(1, 'Name is missing. Say what it is.').max(200, 'Name is longer than 200 characters.'),
  lotId: z.string(), clientId: z.string(),
  widthMm: sideMm('Width'), heightMm: sideMm('Height'), depthMm: sideMm('Depth'),
  notes: z.string().max(10_000, 'Notes are longer than 10 000 characters.'),
}).refine(({ widthMm, heightMm, depthMm }) => [widthMm, heightMm, depthMm].filter((side) => side !== undefined).length % 3 === 0, {
  path: ['widthMm'], message: 'Inside size needs all three sides, or none.',
});

export type SampleFormInput = z.input<typeof sampleFormSchema>;
export const emptySample: SampleFormInput = { code: '', name: '', lotId: '', clientId: '', widthMm: '', heightMm: '', depthMm: '', notes: '' };

/** What the form says, as the API takes it: sides in metres, what was left empty left out. */
export function sampleBody({ code, name, lotId, clientId, widthMm, heightMm, depthMm, notes }: z.output<typeof sampleFormSchema>) {
  const sides = [widthMm, heightMm, depthMm].filter((side) => side !== undefined).map((side) => Number((side / millimetresPerMetre).toPrecision(12)));
  return {
    code, name, ...(lotId ? { lotId } : {}), ...(clientId ? { clientId } : {}),
    ...(sides.length === 3 ? { insideSizeM: sides } : {}), ...(notes.trim() ? { notes } : {}),
  };
}
