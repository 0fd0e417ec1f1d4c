import { createSample } from '@leeside/contracts/samples';
import { expect, test } from 'vitest';
import { emptySample, sampleBody, sampleFormSchema } from './sample-form-schema';

const typed = { ...emptySample, code: ' P-7 ', name: 'Pouch', widthMm: '120', heightMm: '80,5', depthMm: '15' };

test('sides are typed in millimetres and kept in metres', () => {
  const body = sampleBody(sampleFormSchema.parse(typed));
  expect(body).toEqual({ code: 'P-7', name: 'Pouch', insideSizeM: [0.12, 0.0805, 0.015] });
  expect(createSample.body.safeParse(body).success).toBe(true);
});
test('two sides are no size', () => {
  expect(sampleFormSchema.safeParse({ ...typed, depthMm: '' }).error?.issues[0]?.message).toBe('Inside size needs all three sides, or none.');
  expect(sampleBody(sampleFormSchema.parse({ ...emptySample, code: 'P', name: 'P' }))).toEqual({ code: 'P', name: 'P' });
});
