import { decisionRules } from '@leeside/contracts/requirements';
import { z } from 'zod';
import { optionalNumber, typedFrequency, typedLevel } from '../../components/form/typed-quantity';

const attenuation = (name: string) => typedLevel(name, 'dB', '50').refine((db) => db >= 0 && db <= 300, `${name} must lie from 0 to 300 dB.`);

const segmentSchema = z.object({
  from: typedFrequency('Lower frequency'), to: typedFrequency('Upper frequency'),
  fromDb: attenuation('Attenuation at the lower end'), toDb: attenuation('Attenuation at the upper end'),
}).refine(({ from, to }) => from < to, { path: ['to'], message: 'Upper frequency must lie above the lower one.' });

export const requirementFormSchema = z.object({
  name: z.string().trim().min(1, 'Name is missing.').max(200, 'Name is longer than 200 characters.'),
  rule: z.enum(decisionRules),
  guardFactor: optionalNumber('Guard factor', 0.01, 3),
  segments: z.array(segmentSchema).min(1, 'At least one segment is needed.'),
}).superRefine(({ segments }, context) => {
  segments.forEach((segment, at) => {
    const before = segments[at - 1];
    if (before && segment.from < before.to) context.addIssue({ code: 'custom', path: ['segments', at, 'from'], message: `Segment ${String(at + 1)} starts below the end of the one before.` });
  });
});

export type RequirementFormInput = z.input<typeof requirementFormSchema>;
export const emptySegment = { from: '', to: '', fromDb: '', toDb: '' };
export const emptyRequirement: RequirementFormInput = { name: '', rule: 'simple', guardFactor: '1', segments: [emptySegment] };

/** What the form says, as the API takes it. */
export function requirementBody({ name, rule, guardFactor, segments }: z.output<typeof requirementFormSchema>) {
  return {
    name, rule, ...(rule === 'guarded' && guardFactor !== undefined ? { guardFactor } : {}),
    segments: segments.map(({ from, to, fromDb, toDb }) => ({ fromHz: from, toHz: to, fromDb, toDb })),
  };
}
