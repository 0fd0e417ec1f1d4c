import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
import { describe, expect, it } from 'vitest';

/** Files of an open RF library, known by their SHA-256; their values were computed with that library, outside the project. */
const hashes = {
  'lossy-two-port-1-to-10-ghz.s2p': '311ead90ac72e9f05847a21dce8129af93b638334d0295e54e080d4ab899af0f',
  'mismatched-two-port-1-to-10-ghz.s2p': 'b397b1feab68a0a899b58bfbcdbaa9970bccee6ad1e578cd7e19716a5674d014',
  'matched-line-75-to-110-ghz.s2p': '4db573f824f25234a2cb09467551b7130e28d225f44ad85c1090fe3a7a052a0f',
  'slot-surface-75-to-110-ghz.s2p': 'bc19b5cff45992a96c1b8c58d6dd101b4860d95e1a1be888495f4ee6e1580d4c',
} as const;
type OpenFile = keyof typeof hashes;

const bytesOf = (name: OpenFile): Uint8Array => readFileSync(fileURLToPath(new URL(`../../sample-data/open-touchstone/${name}`, import.meta.url)));

/** Attenuation −|S21| in dB, in file order, with its frequencies. */
function transmissionOf(name: OpenFile): { frequencyHz: number[]; lossDb: number[] } {
  const reading = readTraceBytes(bytesOf(name), { fileName: name });
  if (reading.kind !== 'read') throw new Error(`${name} was not read: ${JSON.stringify(reading)}`);
  const found = reading.sweeps.find((sweep) => sweep.name.includes('S21')) ?? reading.sweeps[0];
  if (found === undefined) throw new Error(`${name} has no sweep`);
  expect(found.sweep.levelUnit).toBe('dB');
  return { frequencyHz: Array.from(found.sweep.frequencyHz), lossDb: Array.from(found.sweep.level, (level) => -level) };
}

const middleOf = (values: readonly number[]): number => values.toSorted((one, other) => one - other)[values.length >> 1] ?? NaN;

describe('Touchstone files of an open library', () => {
  it.each(Object.entries(hashes))('%s is the file that the values were computed from', (name, sha256) => {
    expect(createHash('sha256').update(bytesOf(name as OpenFile)).digest('hex')).toBe(sha256);
  });

  it('the lossy two-port loses 0.516899 dB at 1 GHz, 2.6520 dB in the median, 5.6546 dB at most', () => {
    const { frequencyHz, lossDb } = transmissionOf('lossy-two-port-1-to-10-ghz.s2p');
    expect(frequencyHz).toHaveLength(91);
    expect([frequencyHz[0], frequencyHz[90]]).toEqual([1e9, 10e9]);
    expect(lossDb[0]).toBeCloseTo(0.516899, 5);
    expect(middleOf(lossDb)).toBeCloseTo(2.652, 4);
    expect(Math.max(...lossDb)).toBeCloseTo(5.6546, 4);
  });

  it('the mismatched two-port loses 0.4263 to 0.6981 dB', () => {
    const { frequencyHz, lossDb } = transmissionOf('mismatched-two-port-1-to-10-ghz.s2p');
    expect(frequencyHz).toHaveLength(91);
    expect(Math.min(...lossDb)).toBeCloseTo(0.4263, 4);
    expect(Math.max(...lossDb)).toBeCloseTo(0.6981, 4);
  });

  it('the matched line loses nothing at any of its 201 frequencies', () => {
    const { frequencyHz, lossDb } = transmissionOf('matched-line-75-to-110-ghz.s2p');
    expect(frequencyHz).toHaveLength(201);
    expect([frequencyHz[0], frequencyHz[200]]).toEqual([75e9, 110e9]);
    for (const loss of lossDb) expect(Math.abs(loss)).toBeLessThan(1e-6);
  });

  it('the slotted surface loses 0.1961 to 5.8465 dB, 2.916996 dB at its first frequency', () => {
    const { lossDb } = transmissionOf('slot-surface-75-to-110-ghz.s2p');
    expect(lossDb[0]).toBeCloseTo(2.916996, 5);
    expect(Math.min(...lossDb)).toBeCloseTo(0.1961, 4);
    expect(Math.max(...lossDb)).toBeCloseTo(5.8465, 4);
  });
});
