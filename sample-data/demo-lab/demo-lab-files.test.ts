import { readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { demoLabFiles, demoManifest } from './demo-lab-files.js';
import { firstSessionFiles } from './first-session-files.js';

const sampleData = join(dirname(fileURLToPath(import.meta.url)), '..');
const onDisk = (folder: string): string[] =>
  readdirSync(join(sampleData, folder), { recursive: true, encoding: 'utf8' }).filter((path) => statSync(join(sampleData, folder, path)).isFile()).sort();

describe.each([['demo', demoLabFiles], ['first-session', firstSessionFiles]] as const)('the files in %s', (folder, generated) => {
  it('are, byte for byte, what the generator makes', () => {
    const files = generated();
    expect(onDisk(folder)).toEqual([...files.keys()].sort());
    for (const [path, bytes] of files) expect(readFileSync(join(sampleData, folder, path)).equals(bytes), path).toBe(true);
  });
});

describe('the demo manifest', () => {
  it('describes every file, and names only samples, lots, designs and requirements that it holds', () => {
    const paths = demoManifest.sessions.flatMap((session) => session.files.map((file) => file.path));
    expect([...paths, 'manifest.json'].sort()).toEqual(onDisk('demo'));
    expect(paths.length).toBeGreaterThanOrEqual(12);
    const codes = demoManifest.samples.map((sample) => sample.code);
    for (const session of demoManifest.sessions) {
      for (const file of session.files) {
        if (file.role === 'enclosed') expect(codes).toContain(file.sampleCode);
        else expect(file.sampleCode).toBeNull();
      }
      expect(demoManifest.requirements.map((requirement) => requirement.key)).toContain(session.requirementKey);
    }
    for (const lot of demoManifest.lots) expect(demoManifest.designs.map((design) => design.key)).toContain(lot.designKey);
    for (const sample of demoManifest.samples) if (sample.lotCode !== null) expect(demoManifest.lots.map((lot) => lot.code)).toContain(sample.lotCode);
  });

  it('stays under 3 MB', () => {
    expect([...demoLabFiles().values()].reduce((sum, bytes) => sum + bytes.byteLength, 0)).toBeLessThan(3_000_000);
  });
});
