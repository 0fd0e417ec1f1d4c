import { defineConfig } from 'vitest/config';
import { defaultServerConditions } from 'vite';

const conditions = ['source', ...defaultServerConditions];
const suite = (name: string, include: string[], extra: Record<string, unknown> = {}) => ({
  ssr: { resolve: { conditions } },
  resolve: { conditions },
  test: { name, include, environment: 'node', ...extra },
});

/** Four suites: pure units beside the code, outside checks, whole-system tests on real services, the page in a browser. */
export default defineConfig({
  test: {
    projects: [
      suite('unit', ['packages/*/src/**/*.test.ts', 'apps/*/src/**/*.test.ts', 'sample-data/**/*.test.ts'], { testTimeout: 60_000 }),
      suite('web', ['apps/web/src/**/*.test.tsx'], { environment: 'jsdom' }),
      suite('outside-checks', ['tests/outside-checks/**/*.test.ts'], { testTimeout: 120_000 }),
      suite('system', ['tests/{api,journeys,faults,repository}/**/*.test.ts'], {
        fileParallelism: false, testTimeout: 120_000, hookTimeout: 120_000,
      }),
      suite('browser', ['tests/browser/**/*.test.ts'], { fileParallelism: false, testTimeout: 120_000, hookTimeout: 120_000 }),
    ],
  },
});
