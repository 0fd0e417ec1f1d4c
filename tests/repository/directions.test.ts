import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');
const configuration = join(root, '.dependency-cruiser.cjs');
const rules = (createRequire(import.meta.url)(configuration) as { forbidden: { name: string }[] }).forbidden.map((rule) => rule.name);

interface Cruise {
  modules: { source: string; dependencies: { resolved: string }[] }[];
  summary: { violations: { rule: { name: string }; from: string; to: string }[]; totalCruised: number };
}

const cruise = (folder: string, ...targets: string[]): Cruise => {
  const program = join(root, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
  const args = [program, '--config', configuration, '--output-type', 'json', ...targets];
  return JSON.parse(execFileSync(process.execPath, args, { cwd: folder, encoding: 'utf8', maxBuffer: 2 ** 28 })) as Cruise;
};

/** A small house in which every rule of direction is broken once. */
const badHouse: Record<string, string> = {
  'tsconfig.lint.json': '{ "compilerOptions": { "module": "esnext", "moduleResolution": "bundler" } }',
  'packages/units/src/first.ts': "import type { Second } from './second.js';\nexport type First = Second;\n",
  'packages/units/src/second.ts': "import type { First } from './first.js';\nexport type Second = First;\n",
  'packages/units/src/lost.ts': "import '@leeside/nowhere';\n",
  'packages/units/src/reader.ts': "import { readFileSync } from 'node:fs';\nexport const a = readFileSync;\n",
  'packages/units/src/library.ts': "import 'some-library';\n",
  'packages/units/src/tested.test.ts': 'export const a = 1;\n',
  'packages/units/src/tester.ts': "import { a } from './tested.test.js';\nexport const b = a;\n",
  'node_modules/some-library/package.json': '{ "name": "some-library", "version": "1.0.0", "main": "main.js" }',
  'node_modules/some-library/main.js': 'module.exports = 1;\n',
  'packages/object-store/src/upward.ts': "import { a } from '../../../apps/api/src/features/files/one.js';\nexport const b = a;\n",
  'apps/api/src/features/files/one.ts': 'export const a = 1;\n',
  'apps/api/src/features/levels/other.ts': "import { a } from '../files/one.js';\nexport const b = a;\n",
  'apps/worker/src/sideward.ts': "import { a } from '../../api/src/features/files/one.js';\nexport const b = a;\n",
};
const workspaces = rules.filter((name) => name.startsWith('only-what-')).map((name) => name.slice('only-what-'.length, -'-may-use'.length));
for (const workspace of workspaces) {
  const folder = workspace.replace(/^(packages|apps)-/, '$1/');
  badHouse[`${folder}/src/forbidden.ts`] = "import { a } from '../../../apps/elsewhere/src/thing.js';\nexport const b = a;\n";
}
badHouse['apps/elsewhere/src/thing.ts'] = 'export const a = 1;\n';

describe('the rules of direction', () => {
  it('each report a house that breaks it', () => {
    const folder = mkdtempSync(join(tmpdir(), 'bad-house-'));
    try {
      for (const [path, text] of Object.entries(badHouse)) {
        mkdirSync(dirname(join(folder, path)), { recursive: true });
        writeFileSync(join(folder, path), text);
      }
      const { summary } = cruise(folder, 'packages', 'apps');
      expect([...new Set(summary.violations.map((violation) => violation.rule.name))].sort()).toEqual([...rules].sort());
    } finally {
      rmSync(folder, { recursive: true });
    }
  });

  it('look at the real sources, through the names of the packages', () => {
    const { modules, summary } = cruise(root, 'packages', 'apps');
    expect(summary.totalCruised).toBeGreaterThan(30);
    const contracts = modules.filter((module) => module.source.startsWith('packages/contracts/src/'));
    const resolved = contracts.flatMap((module) => module.dependencies.map((dependency) => dependency.resolved));
    expect(resolved.filter((path) => path.startsWith('packages/contracts/src/')).length).toBeGreaterThan(10);
    const throughNames = modules
      .filter((module) => module.source.startsWith('apps/'))
      .flatMap((module) => module.dependencies.map((dependency) => dependency.resolved));
    expect(throughNames.filter((path) => /^packages\/[^/]+\/src\/.+\.ts$/.test(path)).length).toBeGreaterThan(0);
  });
});
