import { formatAttenuation } from '@leeside/units/format-quantity';

const floatNoise = 1e-4;

/** A bound is cut, never rounded up: "at least 57.3" must be true of 57.25. */
export const cutBound = (db: number, decimals: number): number => {
  const unit = 1 / Number(`1e${String(decimals)}`);
  return Number((Math.floor(db / unit + floatNoise) * unit).toFixed(decimals));
};

/** An attenuation as it is shown, a bound with its mark in front. */
export function shownAttenuation(db: number, atLeast: boolean, locale: string, decimals = 1): string {
  return formatAttenuation(atLeast ? cutBound(db, decimals) : db, atLeast, decimals, locale);
}

/** The same in words, for sentences. */
export const attenuationInWords = (db: number, atLeast: boolean, locale: string): string =>
  `${atLeast ? 'at least ' : ''}${formatAttenuation(atLeast ? cutBound(db, 1) : db, false, 1, locale)}`;
