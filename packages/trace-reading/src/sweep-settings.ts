import { entryOf, type Preamble } from './preamble.js';
import { frequencyValue, leadingNumber, levelValue, secondsValue } from './quantity.js';
import { plainWords } from './setting-words.js';
import type { SweepSettings } from './sweep.js';

type Words<Value> = readonly (readonly [RegExp, Value])[];

const detectors: Words<NonNullable<SweepSettings['detector']>> = [
  [/quasi|\bqp\b/, 'quasi-peak'], [/neg|minpeak|min peak/, 'negative peak'], [/\brms\b|effektiv|efficace/, 'rms'], [/average|avg|\bav\b|mittelwert|moyen/, 'average'], [/sample|abtast|echantillon/, 'sample'],
  [/peak|\bpos|crete|spitze|maxpeak/, 'peak'], [/auto|normal/, 'auto'],
];
const traceModes: Words<NonNullable<SweepSettings['traceMode']>> = [
  [/max ?h|maxhold|max hold|maximum|max halten|maximalwert/, 'max hold'], [/min ?h|minhold|min hold|minimum|minimalwert/, 'min hold'], [/average|avg|mittel|moyen/, 'average'],
  [/clear|write|clrw|live|normal|refresh|aktuell|direct/, 'clear write'], [/view|hold|freeze|gehalten/, 'view'],
];
const averagings: Words<NonNullable<SweepSettings['averaging']>> = [[/power|rms|leistung|puissance|lin/, 'power'], [/volt|spannung|tension/, 'voltage'], [/log|video/, 'log']];

function wordOf<Value>(list: Words<Value>, text: string | undefined): Value | undefined {
  const plain = plainWords(text ?? '');
  return plain === '' ? undefined : list.find(([pattern]) => pattern.test(plain))?.[1];
}

/** Trace mode that a name tells, such as "Trace1(VIEW)" or "Max Hold". */
export function traceModeIn(text: string): SweepSettings['traceMode'] {
  return wordOf(traceModes, text.replace(/[()[\]]/g, ' '));
}

/** Detector that a word tells. */
export function detectorIn(text: string): SweepSettings['detector'] {
  return wordOf(detectors, text);
}

function onOff(text: string | undefined): boolean | undefined {
  const plain = plainWords(text ?? '');
  if (/^(?:on|ein|an|yes|1|true|marche|oui|actif)\b/.test(plain)) return true;
  return /^(?:off|aus|no|0|false|arret|non|inactif)\b/.test(plain) ? false : undefined;
}

function defined(settings: { [Key in keyof SweepSettings]: SweepSettings[Key] | undefined }): SweepSettings {
  return Object.fromEntries(Object.entries(settings).filter(([, value]) => value !== undefined)) as SweepSettings;
}

/** The analyzer's settings, as far as the preamble tells them in words that are known. A bandwidth of 0 tells nothing. */
export function settingsOf(preamble: Preamble): SweepSettings {
  const text = (key: Parameters<typeof entryOf>[1]): string | undefined => entryOf(preamble, key)?.value.split('|')[0]?.trim();
  const entry = (key: Parameters<typeof entryOf>[1]): { value: string; keyText: string } => entryOf(preamble, key) ?? { value: '', keyText: '' };
  const hertz = (key: 'rbw' | 'vbw'): number | undefined => {
    const found = frequencyValue(entry(key).value, entry(key).keyText);
    return found !== null && found.hz > 0 ? found.hz : undefined;
  };
  const number = (key: Parameters<typeof entryOf>[1]): number | undefined => leadingNumber(entry(key).value)?.value;
  const held = number('held');
  const referenceLevel = levelValue(entry('referenceLevel').value, entry('referenceLevel').keyText);
  const impedance = number('impedance');
  return defined({
    rbwHz: hertz('rbw'), vbwHz: hertz('vbw'), detector: wordOf(detectors, text('detector')), traceMode: wordOf(traceModes, text('traceMode')), averaging: wordOf(averagings, text('averaging')),
    held: held !== undefined && held >= 1 && Number.isInteger(held) ? held : undefined, attenuationDb: number('attenuation'), preamplifier: onOff(text('preamplifier')),
    referenceLevelDbm: referenceLevel?.unit === 'dBm' ? referenceLevel.value : undefined, sweepTimeS: secondsValue(entry('sweepTime').value, entry('sweepTime').keyText) ?? undefined,
    impedanceOhm: impedance !== undefined && impedance > 0 ? impedance : undefined, correctionsApplied: onOff(text('corrections')), instrument: text('instrument')?.slice(0, 100), serial: text('serial')?.slice(0, 100),
  });
}
