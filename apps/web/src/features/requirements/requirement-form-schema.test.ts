import { createRequirement } from '@leeside/contracts/requirements';
import { expect, test } from 'vitest';
import { requirementBody, requirementFormSchema, type RequirementFormInput } from './requirement-form-schema';

const typed: RequirementFormInput = {
  name: 'Two steps', rule: 'guarded', guardFactor: '1',
  segments: [{ from: '100 kHz', to: '1 GHz', fromDb: '50', toDb: '50 dB' }, { from: '1 GHz', to: '6 GHz', fromDb: '60', toDb: '40' }],
};
const messages = (form: RequirementFormInput) => requirementFormSchema.safeParse(form).error?.issues.map(({ path, message }) => [path.join('.'), message]);

test('what is typed becomes a body that the contract takes', () => {
  const body = requirementBody(requirementFormSchema.parse(typed));
  expect(body.segments[1]).toEqual({ fromHz: 1e9, toHz: 6e9, fromDb: 60, toDb: 40 });
  expect(createRequirement.body.safeParse(body).success).toBe(true);
});
test('segments that overlap are said at the field', () => {
  const [first, second] = typed.segments;
  expect(messages({ ...typed, segments: [first!, { ...second!, from: '900 MHz' }] })).toEqual([['segments.1.from', 'Segment 2 starts below the end of the one before.']]);
});
test('a segment upside down is said at its upper end', () => {
  expect(messages({ ...typed, segments: [{ from: '2 GHz', to: '1 GHz', fromDb: '50', toDb: '50' }] })).toEqual([['segments.0.to', 'Upper frequency must lie above the lower one.']]);
});
test('more attenuation than can be is refused', () => {
  expect(messages({ ...typed, segments: [{ from: '1 GHz', to: '2 GHz', fromDb: '301', toDb: '50' }] })).toEqual([['segments.0.fromDb', 'Attenuation at the lower end must lie from 0 to 300 dB.']]);
});
