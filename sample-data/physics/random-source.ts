/** A stream of chance that a seed decides: the same seed gives the same numbers on every machine. */
export interface RandomSource {
  /** Evenly spread over 0 (included) to 1 (excluded). */
  uniform(): number;
  /** Normal, mean 0, standard deviation 1. */
  gaussian(): number;
}

/** Spreads a seed over 32 bits, so that neighbouring seeds have nothing in common. */
function scrambled(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x9e3779b9) >>> 0;
    let mixed = state ^ (state >>> 16);
    mixed = Math.imul(mixed, 0x21f0aaad);
    mixed ^= mixed >>> 15;
    mixed = Math.imul(mixed, 0x735a2d97);
    return (mixed ^ (mixed >>> 15)) >>> 0;
  };
}

/**
 * A small counting generator with 128 bits of state (sfc32); normal numbers by the polar method.
 * @param seed any whole number.
 * @example randomSource(7).uniform() === randomSource(7).uniform() // true
 */
export function randomSource(seed: number): RandomSource {
  const word = scrambled(seed);
  let [a, b, c, counter] = [word(), word(), word(), 1];
  const uniform = (): number => {
    const sum = (((a + b) >>> 0) + counter) >>> 0;
    counter = (counter + 1) >>> 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) >>> 0;
    c = (((c << 21) | (c >>> 11)) + sum) >>> 0;
    return sum / 0x1_0000_0000;
  };
  for (let round = 0; round < 12; round += 1) uniform();
  let spare: number | null = null;
  const gaussian = (): number => {
    if (spare !== null) {
      const kept = spare;
      spare = null;
      return kept;
    }
    let x = 0;
    let y = 0;
    let squared = 0;
    do {
      x = 2 * uniform() - 1;
      y = 2 * uniform() - 1;
      squared = x * x + y * y;
    } while (squared >= 1 || squared === 0);
    const scale = Math.sqrt((-2 * Math.log(squared)) / squared);
    spare = y * scale;
    return x * scale;
  };
  return { uniform, gaussian };
}
