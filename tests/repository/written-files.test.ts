import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');
const skipped = new Set(['node_modules', 'dist', 'dist-types', '.git', '.data', 'coverage']);
const find = ['.', ...[...skipped].flatMap((name) => ['-name', name, '-prune', '-o']), '-type', 'f', '-print'];
const files = execFileSync('find', find, { cwd: root, encoding: 'utf8' }).split('\n').filter(Boolean).map((path) => path.slice(2));
const read = (path: string) => readFileSync(join(root, path), 'utf8');
const isCode = (path: string) => /\.(ts|tsx|js|mjs|cjs|sh|css)$/.test(path) || dirname(path) === 'docker-less-scripts' || path === '.ci/run';
const code = files.filter(isCode);

describe('every file of code', () => {
  it('is found', () => {
    expect(code.length).toBeGreaterThan(80);
    expect(code).toContain('docker-less-scripts/start');
  });

  it('has 250 lines or fewer, shell scripts and styles as well', () => {
    const long = code.filter((path) => read(path).split('\n').length - 1 > 250);
    expect(long).toEqual([]);
  });

  it('has no comment that would switch a check off', () => {
    const words = ['eslint-disable', '@ts-ignore', '@ts-nocheck', 'istanbul ignore', 'v8 ignore'];
    const self = ['tests/repository/written-files.test.ts', 'tests/repository/lint-rules.test.ts'];
    const found = code.filter((path) => !self.includes(path)).filter((path) => words.some((word) => read(path).includes(word)));
    expect(found).toEqual([]);
  });

  it('of a test runs: none is switched off or runs alone', () => {
    const tests = code.filter((path) => /\.test\.tsx?$/.test(path) && path !== 'tests/repository/written-files.test.ts');
    expect(tests.length).toBeGreaterThan(0);
    expect(tests.filter((path) => /\b(it|test|describe)\.(skip|only|todo)\b/.test(read(path)) && basename(path) !== 'scripts.test.ts')).toEqual([]);
  });
});

describe('the documents', () => {
  const documents = files.filter((path) => path.endsWith('.md'));
  const linksOf = (path: string) =>
    [...read(path).matchAll(/\]\((?!https?:|mailto:|#)([^)#\s]+)/g)].map((match) => ({ path, target: match[1]! }));

  it('link to files that exist', () => {
    const links = documents.flatMap(linksOf);
    expect(links.length).toBeGreaterThan(0);
    expect(links.filter(({ path, target }) => !existsSync(join(root, dirname(path), target)))).toEqual([]);
  });

  it('name scripts that exist', () => {
    const named = documents.flatMap((path) => [...read(path).matchAll(/docker-less-scripts\/([a-z.-]+[a-z])/g)].map((match) => match[1]!));
    expect(named.length).toBeGreaterThan(0);
    expect([...new Set(named)].filter((name) => !existsSync(join(root, 'docker-less-scripts', name)))).toEqual([]);
  });

  it('name npm scripts that exist', () => {
    const scripts = Object.keys((JSON.parse(read('package.json')) as { scripts: Record<string, string> }).scripts);
    const named = documents.flatMap((path) => [...read(path).matchAll(/npm run ([a-z-]+)/g)].map((match) => match[1]!));
    expect([...new Set(named)].filter((name) => !scripts.includes(name))).toEqual([]);
  });
});
