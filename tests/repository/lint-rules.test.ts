import { join } from 'node:path';
import { ESLint, type Linter } from 'eslint';
import tseslint from 'typescript-eslint';
import { describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');
const withoutTypes = new ESLint({ cwd: root, overrideConfig: tseslint.configs.disableTypeChecked as Linter.Config });
const withTypes = new ESLint({
  cwd: root,
  overrideConfig: { languageOptions: { parserOptions: { disallowAutomaticSingleRunInference: true } } },
});

const rulesOn = async (eslint: ESLint, file: string, code: string): Promise<(string | null)[]> => {
  const [result] = await eslint.lintText(code, { filePath: join(root, file) });
  return (result?.messages ?? []).map((message) => message.ruleId ?? message.message);
};

const ordinary = 'packages/lots/src/ordinary-name.ts';
const lines = (count: number, line = 'void 0;') => Array.from({ length: count }, () => line).join('\n');
const branches = (count: number) => lines(count, 'if (n === 1) n += 1;');

const badSamples: [rule: string, file: string, code: string][] = [
  ['max-lines', ordinary, lines(251)],
  ['max-lines', ordinary, lines(251, '// a comment counts as well')],
  ['max-lines-per-function', ordinary, `export function f() {\n${lines(60)}\n}\n`],
  ['max-lines-per-function', 'apps/web/src/components/Panel.tsx', `export function F() {\n${lines(90)}\n}\n`],
  ['complexity', ordinary, `export function f(n: number) {\n${branches(10)}\nreturn n;\n}\n`],
  ['max-params', ordinary, 'export const f = (a: 1, b: 1, c: 1, d: 1, e: 1) => [a, b, c, d, e];\n'],
  ['no-warning-comments', ordinary, `// ${'TO'}${'DO'} later\n`],
  ['eqeqeq', ordinary, 'export const f = (a: number) => a == 1;\n'],
  ['@typescript-eslint/no-explicit-any', ordinary, 'export const f = (a: any) => [a];\n'],
  ['@typescript-eslint/ban-ts-comment', ordinary, `// @ts-${'ignore'}\nexport const a: number = 1;\n`],
  ['max-params', ordinary, '/* eslint-disable */\nexport const f = (a: 1, b: 1, c: 1, d: 1, e: 1) => [a, b, c, d, e];\n'],
  ['no-restricted-syntax', ordinary, 'export const f = (a: number) => 20 * Math.log10(a);\n'],
  ['no-restricted-syntax', ordinary, 'export const { log10 } = Math;\n'],
  ['no-restricted-syntax', ordinary, 'export const f = (a: number) => 10 ** (a / 20);\n'],
  ['no-restricted-syntax', ordinary, 'export const f = (a: number) => Math.pow(10, a / 20);\n'],
  ['no-restricted-syntax', 'apps/api/src/start-server.ts', 'export const port = process.env.PORT;\n'],
  ['no-restricted-syntax', 'packages/units/src/decibels.ts', 'export const port = process.env.PORT;\n'],
  ['no-restricted-syntax', 'apps/api/src/configuration.ts', 'export const f = (a: number) => Math.log10(a);\n'],
  ['no-restricted-syntax', 'apps/api/src/start-server.ts', "export const load = () => import('knex');\n"],
  ['no-restricted-imports', 'apps/api/src/start-server.ts', "import { env } from 'node:process';\nexport const a = env;\n"],
  ['react-hooks/rules-of-hooks', 'apps/web/src/components/Panel.tsx',
    "import { useState } from 'react';\nexport function Panel(p: { a: boolean }) {\n if (p.a) useState(1);\n return null;\n}\n"],
  ['react-hooks/exhaustive-deps', 'apps/web/src/components/Panel.tsx',
    "import { useEffect } from 'react';\nexport function Panel(p: { a: () => void }) {\n useEffect(() => { p.a(); }, []);\n return null;\n}\n"],
  ...['utils', 'helpers', 'common', 'shared', 'types', 'models', 'hooks', 'misc', 'index', 'CamelCase', 'snake_case'].map(
    (name): [string, string, string] => ['leeside/file-name', `packages/lots/src/${name}.ts`, 'export const a = 1;\n'],
  ),
];

const libraries = [
  'busboy', 'passport', 'passport-jwt', 'jsonwebtoken', '@node-rs/argon2', 'bullmq', 'ioredis', 'knex', 'pg', 'pg-copy-streams',
  'papaparse', 'uplot', 'uplot/dist/uPlot.min.css', 'pino', 'pino-http',
];

const typedBadSamples: [rule: string, code: string][] = [
  ['@typescript-eslint/no-floating-promises', 'export const f = () => { Promise.resolve(1); };\n'],
  ['@typescript-eslint/no-misused-promises', 'export const f = (a: Promise<boolean>) => (a ? 1 : 2);\n'],
  ['@typescript-eslint/await-thenable', 'export const f = async (a: number) => { await a; };\n'],
  ['@typescript-eslint/no-unsafe-return', 'export const f = (a: string): number => JSON.parse(a);\n'],
  ['@typescript-eslint/switch-exhaustiveness-check',
    "export const f = (a: 'x' | 'y') => { switch (a) { case 'x': return 1; } return 2; };\n"],
];

describe('a bad sample is reported by', () => {
  it.each(badSamples)('%s in %s', async (rule, file, code) => {
    expect(await rulesOn(withoutTypes, file, code)).toContain(rule);
  });

  it.each(typedBadSamples)('%s, which knows the types', async (rule, code) => {
    expect(await rulesOn(withTypes, 'packages/units/src/decibels.ts', code)).toContain(rule);
  });

  it.each(libraries)('the rule of one door for %s', async (library) => {
    const code = `import type * as a from '${library}';\nexport type B = typeof a;\n`;
    expect(await rulesOn(withoutTypes, 'packages/lots/src/ordinary-name.ts', code)).toContain('no-restricted-imports');
  });
});

describe('what is allowed passes', () => {
  const goodSamples: [file: string, code: string][] = [
    ['packages/units/src/decibels.ts', 'export const f = (a: number) => 20 * Math.log10(a) + 10 ** a;\n'],
    ['packages/lots/src/ordinary-name.test.ts', 'export const f = (a: number) => 20 * Math.log10(a);\n'],
    ['apps/api/src/configuration.ts', 'export const port = process.env.PORT;\n'],
    ['apps/web/src/components/CurvePlot.tsx', "import uPlot from 'uplot';\nexport const a = uPlot;\n"],
    ['apps/api/src/http/receive-files.ts', "import busboy from 'busboy';\nimport pino from 'pino';\nexport const a = [busboy, pino];\n"],
    ['packages/database/src/open-database.ts', "import knex from 'knex';\nexport const a = knex;\n"],
    ['packages/lots/src/ordinary-name.ts', `export function f() {\n${lines(58)}\n}\n`],
  ];

  it.each(goodSamples)('%s', async (file, code) => {
    expect(await rulesOn(withoutTypes, file, code)).toEqual([]);
  });
});
