import { describe, expect, it } from 'vitest';
import { carrierResponseDbm } from './carrier-response.js';
import { frequencyAxisHz } from './frequency-axis.js';
import { randomSource } from './random-source.js';
import { meanNoiseDbm } from './receiver-noise.js';
import { simulateSweep } from './simulate-sweep.js';
import { openLevelDbm } from './transmit-chain.js';

const ideal = { noiseFigureDb: 0, inputAttenuationDb: 0, noiseSlopeDbPerSixGigahertz: 0 };

describe('a receiver', () => {
  it('has kTB at 290 K as its noise, and more with noise figure and attenuation', () => {
    const at = Float64Array.of(1e9);
    expect(meanNoiseDbm(ideal, 100_000, at)[0]).toBeCloseTo(-123.975, 3);
    expect(meanNoiseDbm({ ...ideal, noiseFigureDb: 20, inputAttenuationDb: 10 }, 1_000_000, at)[0]).toBeCloseTo(-83.975, 3);
  });
});

describe('a carrier on the display', () => {
  it('stands at its full level in its own point, a filter narrower than the step shows it nowhere else', () => {
    const axisHz = frequencyAxisHz(1e9, 1.1e9, 101);
    const seen = carrierResponseDbm({ frequencyHz: Float64Array.of(1.0403e9), levelDbm: Float64Array.of(-40) }, axisHz, 10_000);
    expect(seen[40]).toBeCloseTo(-40, 9);
    expect(Array.from(seen).filter((levelDbm) => levelDbm > -190)).toHaveLength(1);
  });

  it('is 3 dB down half a bandwidth away where the filter is wider than the step', () => {
    const axisHz = frequencyAxisHz(1e9, 1e9 + 1e6, 1001);
    const seen = carrierResponseDbm({ frequencyHz: Float64Array.of(1.0005e9), levelDbm: Float64Array.of(-40) }, axisHz, 100_000);
    expect(seen[500]).toBeCloseTo(-40, 9);
    expect(seen[550]).toBeCloseTo(-43, 0);
    expect(seen[450]).toBeCloseTo(seen[550] ?? 0, 6);
  });
});

describe('simulateSweep', () => {
  it('shows a strong carrier at its level in the analyzer\'s steps, the same for the same seed', () => {
    const physics = { signalDbm: new Float64Array(50).fill(-30.126), noiseDbm: new Float64Array(50).fill(-130), looks: 10, combined: 'held', quantumDb: 0.1 } as const;
    const levels = simulateSweep(physics, randomSource(3));
    for (const levelDbm of levels) expect(levelDbm).toBeCloseTo(-30.1, 9);
    expect(simulateSweep({ ...physics, noiseDbm: new Float64Array(50).fill(-40) }, randomSource(4)))
      .toEqual(simulateSweep({ ...physics, noiseDbm: new Float64Array(50).fill(-40) }, randomSource(4)));
  });
});

describe('openLevelDbm', () => {
  it('loses to the cable with the square root of frequency and to short antennas by 40 dB a decade', () => {
    const chain = { levelDbm: -10, cableLossDbAtGigahertz: 8, antennaCornerHz: 1e7, rippleDb: 0, ripplePeriodHz: 1e8 };
    const [deep = 0, low = 0, one = 0, four = 0] = openLevelDbm(chain, Float64Array.of(1e5, 1e6, 1e9, 4e9));
    expect(one).toBeCloseTo(-18, 4);
    expect(four).toBeCloseTo(-26, 4);
    expect(low - deep).toBeCloseTo(39.8, 0);
  });
});
