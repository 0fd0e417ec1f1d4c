import { measuringRoleSchema } from '@leeside/contracts/measuring-roles';
import { z } from 'zod';
import { typedFrequency, typedLevel } from '../../../components/form/typed-quantity';

export const levelFormSchema = z.object({
  role: measuringRoleSchema, sampleId: z.string(), condition: z.string().trim().max(200, 'Condition is longer than 200 characters.'),
  frequency: typedFrequency('Frequency'), level: typedLevel('Level', 'dBm'), inTheNoise: z.boolean(),
});

export type LevelFormInput = z.input<typeof levelFormSchema>;

export const emptyLevel: LevelFormInput = { role: 'reference', sampleId: '', condition: '', frequency: '', level: '', inTheNoise: false };

/** What the form says, as the API takes it: a sample and a condition belong to an enclosed level alone. */
export function levelBody({ role, sampleId, condition, frequency, level, inTheNoise }: z.output<typeof levelFormSchema>) {
  const isEnclosed = role === 'enclosed';
  return {
    role, frequencyHz: frequency, levelDbm: level, ...(isEnclosed && sampleId ? { sampleId } : {}),
    ...(isEnclosed && condition ? { condition } : {}), ...(isEnclosed && inTheNoise ? { inTheNoise } : {}),
  };
}
