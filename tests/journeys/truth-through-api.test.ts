import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { judgeCurve } from '../../sample-data/truth/judge-curve.js';
import { makeTruthSet } from '../../sample-data/truth/make-truth-set.js';
import { failedGateLines } from '../truth/gate-lines.js';
import { truthVariants, variantName } from '../truth/truth-variants.js';
import { apiClient, type ApiClient } from './api-client.js';
import { startSystem, type RunningSystem } from './running-system.js';
import { sendTruthSet } from './send-truth-set.js';

describe('files sent through the API, their curves judged by what is true', () => {
  let system: RunningSystem;
  let client: ApiClient;

  beforeAll(async () => {
    system = await startSystem();
    client = apiClient(system.baseUrl, await system.tokenOf('engineer'));
  });
  afterAll(async () => system.stop());

  it.each(truthVariants.map((variant) => [variantName(variant), variant] as const))('%s', async (_name, variant) => {
    const { files, truth } = makeTruthSet(variant);
    const curve = await sendTruthSet(client, `TRUTH-${variant.seed.toString()}`, files);
    expect(curve.state).toBe('ready');
    expect(curve.style).toBe(variant.style);
    expect(curve.sampleId).toBe(curve.expectedSampleId);
    expect(failedGateLines(judgeCurve(curve.points, truth))).toEqual([]);
  });
});
