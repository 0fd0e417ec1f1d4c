import type { FileBody } from '@leeside/contracts/files';
import { formatFrequency, formatLevel } from '@leeside/units/format-quantity';

type Transcription = NonNullable<FileBody['transcription']>;
export interface TranscriptionRow { what: string; found: string; decidedBy: string }

const delimiterWords: Record<string, string> = { ',': 'comma', ';': 'semicolon', '\t': 'tab', ' ': 'blanks', '|': 'bar' };
const decimalWords: Record<string, string> = { '.': 'point', ',': 'comma' };

const settingWords: Record<string, string> = {
  rbwHz: 'resolution bandwidth', vbwHz: 'video bandwidth', detector: 'detector', traceMode: 'trace mode', averaging: 'averaging', held: 'sweeps held or averaged',
  attenuationDb: 'input attenuation', preamplifier: 'preamplifier', referenceLevelDbm: 'reference level', sweepTimeS: 'sweep time', impedanceOhm: 'impedance',
  correctionsApplied: 'corrections applied by the analyzer', instrument: 'instrument', serial: 'serial number',
};

const decisionWords: Record<string, string> = {
  columnsPassedOver: 'columns passed over', frequencyAxis: 'frequency axis', frequencyColumn: 'column of frequencies', levelColumns: 'columns of levels',
};

/** `same-frequency` and `sameFrequency` are one thing: what a person answered is written the first way, what was found the second. */
const asWords = (name: string): string => name.replaceAll('-', ' ').replaceAll(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();

function settingText(name: string, value: unknown, locale: string): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value !== 'number') return String(value);
  if (name.endsWith('Hz')) return formatFrequency(value, 6, locale);
  const unit = /(Dbm|Db|Ohm|S)$/.exec(name)?.[1];
  if (unit === 'Dbm') return formatLevel(value, 'dBm', 1, locale);
  if (unit === 'Db') return formatLevel(value, 'dB', 1, locale);
  if (unit === 'Ohm') return formatLevel(value, 'Ω', 0, locale);
  if (unit === 'S') return formatLevel(value, 's', 3, locale);
  return value.toLocaleString(locale);
}

/** Everything that was decided about a file, each with what it was decided by. */
export function transcriptionRows(transcription: Transcription, locale: string): TranscriptionRow[] {
  const { decidedBy, settings } = transcription;
  const row = (key: string, what: string, found: string | null): TranscriptionRow[] =>
    found === null ? [] : [{ what, found, decidedBy: decidedBy[asWords(key).replaceAll(' ', '-')] ?? decidedBy[key] ?? '' }];
  const lineText = (line: number | null): string | null => (line === null ? null : `line ${String(line)}`);
  return [
    ...row('encoding', 'encoding', transcription.encoding),
    ...row('delimiter', 'columns parted by', transcription.delimiter && (delimiterWords[transcription.delimiter] ?? transcription.delimiter)),
    ...row('decimalMark', 'decimal mark', transcription.decimalMark && (decimalWords[transcription.decimalMark] ?? transcription.decimalMark)),
    ...row('headerLine', 'header', lineText(transcription.headerLine)),
    ...row('firstDataLine', 'first row of numbers', lineText(transcription.firstDataLine)),
    ...row('rows', 'rows kept', String(transcription.rowsKept)),
    ...row('rowsSkipped', 'rows skipped', String(transcription.rowsSkipped)),
    ...row('frequencyUnit', 'unit of frequency', transcription.frequencyUnit),
    ...row('levelUnit', 'unit of level', transcription.levelUnit),
    ...Object.entries(settings).flatMap(([name, value]) => row(name, settingWords[name] ?? name, settingText(name, value, locale))),
  ];
}

/** What was decided about and has no row of its own: nothing decided stays unsaid. */
export function otherDecisions(transcription: Transcription): [string, string][] {
  const said = new Set([...['encoding', 'delimiter', 'decimalMark', 'headerLine', 'firstDataLine', 'rows', 'rowsSkipped', 'frequencyUnit', 'levelUnit'], ...Object.keys(transcription.settings)].map(asWords));
  return Object.entries(transcription.decidedBy).filter(([what]) => !said.has(asWords(what))).map(([what, how]) => [decisionWords[what] ?? asWords(what), how]);
}
