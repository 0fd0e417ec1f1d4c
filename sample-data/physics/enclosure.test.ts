import { describe, expect, it } from 'vitest';
import { cavityModesHz } from './cavity-modes.js';
import { enclosureAttenuationDb, slotAttenuationDb } from './enclosure.js';
import { frequencyAxisHz } from './frequency-axis.js';

describe('slotAttenuationDb', () => {
  // Worked out outside the project from 20·log10(λ/2L).
  it.each([[0.01, 100e6, 43.516], [0.01, 433.92e6, 30.768], [0.01, 2450e6, 15.732], [0.01, 5800e6, 8.247], [0.1, 915e6, 4.287], [0.1, 1.6e9, 0]])(
    'of a slot %f m long at %i Hz is %f dB', (slotLengthM, frequencyHz, expectedDb) => {
      expect(slotAttenuationDb(slotLengthM, frequencyHz)).toBeCloseTo(expectedDb, 3);
    });
});

describe('cavityModesHz', () => {
  it('knows the first resonances of a flat box, a case and a cube', () => {
    const megahertz = (modesHz: number[], count: number): number[] => modesHz.slice(0, count).map((modeHz) => Math.round(modeHz / 1e3) / 1e3);
    expect(megahertz(cavityModesHz([0.3, 0.12, 0.3], 1.2e9), 2)).toEqual([706.618, 1117.261]);
    expect(megahertz(cavityModesHz([0.3, 0.4, 0.05], 1e9), 1)).toEqual([624.568]);
    expect(megahertz(cavityModesHz([1, 1, 1], 3e8), 2)).toEqual([211.985, 259.628]);
  });
});

describe('enclosureAttenuationDb', () => {
  const frequencyHz = frequencyAxisHz(3e7, 6e9, 2001);
  const good = { plateauDb: 90, slotLengthM: 0.0003, insideSizeM: [0.2, 0.12, 0.02] as const, dipDb: 0, quality: 45 };

  it('falls by 20 dB a decade where the slot leaks, and a longer slot leaks more', () => {
    const [low = 0, high = 0] = enclosureAttenuationDb(good, Float64Array.of(5e8, 5e9));
    expect(low - high).toBeCloseTo(20, 1);
    const worn = enclosureAttenuationDb({ ...good, slotLengthM: 0.0012 }, frequencyHz);
    expect(enclosureAttenuationDb(good, frequencyHz).every((attenuationDb, point) => attenuationDb > (worn[point] ?? 0))).toBe(true);
  });

  it('dips at the first resonance of the inside', () => {
    const modeHz = cavityModesHz(good.insideSizeM, 6e9)[0] ?? 0;
    const [there = 0] = enclosureAttenuationDb({ ...good, dipDb: 6 }, Float64Array.of(modeHz));
    const [without = 0] = enclosureAttenuationDb(good, Float64Array.of(modeHz));
    expect(modeHz).toBeCloseTo(1.45673e9, -5);
    expect(without - there).toBeGreaterThan(5.9);
    expect(without - there).toBeLessThan(6.5);
  });
});
