import { entryOf, type Preamble } from './preamble.js';
import { frequencyValue, leadingNumber, levelValue, secondsValue } from './quantity.js';
import { plainWords, type PreambleKey } from './setting-words.js';
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

function onOff(text: string | undefined): boolean | undefined {
  const plain = plainWords(text ?? '');
  if (/^(?:on|ein|an|yes|1|true|marche|oui|actif)\b/.test(plain)) return true;
  return /^(?:off|aus|no|0|false|arret|non|inactif)\b/.test(plain) ? false : undefined;
}

function defined(settings: { [Key in keyof SweepSettings]: SweepSettings[Key] | undefined }): SweepSettings {
  return Object.fromEntries(Object.entries(settings).filter(([, value]) => value !== undefined));
}

/** The analyzer's settings, as far as the preamble tells them in words that are known. A bandwidth of 0 tells nothing. */
export function settingsOf(preamble: Preamble): SweepSettings {
  const text = (key: PreambleKey): string | undefined => entryOf(preamble, key)?.value.split('|')[0]?.trim();
  return defined({
    ...numbersOf(preamble), detector: wordOf(detectors, text('detector')), traceMode: wordOf(traceModes, text('traceMode')), averaging: wordOf(averagings, text('averaging')),
    preamplifier: onOff(text('preamplifier')), correctionsApplied: onOff(text('corrections')), instrument: text('instrument')?.slice(0, 100), serial: text('serial')?.slice(0, 100),
  });
}

type Found<Keys extends keyof SweepSettings> = { [Key in Keys]: SweepSettings[Key] | undefined };

function numbersOf(preamble: Preamble): Found<'rbwHz' | 'vbwHz' | 'held' | 'attenuationDb' | 'referenceLevelDbm' | 'sweepTimeS' | 'impedanceOhm'> {
  const entry = (key: PreambleKey): { value: string; keyText: string } => entryOf(preamble, key) ?? { value: '', keyText: '' };
  const number = (key: PreambleKey): number | undefined => leadingNumber(entry(key).value)?.value;
  const positive = (value: number | undefined): number | undefined => (value !== undefined && value > 0 ? value : undefined);
  const hertz = (key: 'rbw' | 'vbw'): number | undefined => positive(frequencyValue(entry(key).value, entry(key).keyText)?.hz);
  const held = positive(number('held'));
  const referenceLevel = levelValue(entry('referenceLevel').value, entry('referenceLevel').keyText);
  return {
    rbwHz: hertz('rbw'), vbwHz: hertz('vbw'), held: Number.isInteger(held) ? held : undefined, attenuationDb: number('attenuation'), impedanceOhm: positive(number('impedance')),
    referenceLevelDbm: referenceLevel?.unit === 'dBm' ? referenceLevel.value : undefined, sweepTimeS: secondsValue(entry('sweepTime').value, entry('sweepTime').keyText) ?? undefined,
  };
}
