import { formatFrequency } from '@leeside/units/format-quantity';

const blank = '\u00a0';

/** Frequencies of one column in a mono face, padded behind their digits so that the decimal marks stand under one another. */
export function alignedFrequencies(frequencyHz: readonly number[], locale: string): string[] {
  const parts = frequencyHz.map((hz) => {
    const [digits = '', unit = ''] = formatFrequency(hz, 6, locale).split('\u2009');
    return { digits, unit, behind: /[.,].*$/.exec(digits)?.[0].length ?? 0 };
  });
  const widest = Math.max(0, ...parts.map(({ behind }) => behind));
  return parts.map(({ digits, unit, behind }) => `${digits}${blank.repeat(widest - behind)}\u2009${unit.padStart(3, blank)}`);
}
