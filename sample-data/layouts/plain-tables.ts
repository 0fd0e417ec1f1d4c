import type { Fixture } from './fixture.js';
import { utf16, utf8 } from './encode-text.js';
import { axisHz, dbmSweep, kept, levels, withMark, written } from './true-sweep.js';

const frequencyHz = axisHz(30_000_000, 250_000, 24);
const level = levels(24);
const sweeps = [dbmSweep(frequencyHz, level)];
const rows = (line: (hz: number, dbm: number, at: number) => string): string => frequencyHz.map((hz, at) => line(hz, level[at] ?? NaN, at)).join('');
const plain = (file: string, text: string): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps } });

const dbuv = level.map((value) => Math.round((value + 107) * 100) / 100);
const inDbuv = [dbmSweep(frequencyHz, kept(dbuv, 'dBµV'))];
const longHz = axisHz(9_000, 7_500, 4001);
const longLevel = levels(4001, 5);

/** Tables without anything before their names, the way people export them from an office program. */
export const plainTables: readonly Fixture[] = [
  plain('hertz-and-dbm.csv', `Frequency [Hz],Level [dBm]\n${rows((hz, dbm) => `${hz},${dbm}\n`)}`),
  plain('megahertz-in-round-brackets.csv', `Freq (MHz),Ampl (dBm)\r\n${rows((hz, dbm) => `${written(hz, 'MHz')},${withMark(dbm)}\r\n`)}`),
  plain('every-cell-quoted.csv', `"Frequency (MHz)","Amplitude (dBm)"\n${rows((hz, dbm) => `"${written(hz, 'MHz')}","${withMark(dbm)}"\n`)}`),
  plain('quoted-decimal-commas-between-commas.csv', `"Frequenz (MHz)","Pegel (dBm)"\n${rows((hz, dbm) => `"${(hz / 1e6).toFixed(2).replace('.', ',')}","${withMark(dbm, ',')}"\n`)}`),
  plain('unit-after-a-slash.csv', `f/MHz;P/dBm\n${rows((hz, dbm) => `${(hz / 1e6).toFixed(2)};${withMark(dbm)}\n`)}`),
  plain('unit-after-in.csv', `Frequenz in MHz;Pegel in dBm\n${rows((hz, dbm) => `${(hz / 1e6).toFixed(3).replace('.', ',')};${withMark(dbm, ',')}\n`)}`),
  plain('units-alone-as-names.txt', `MHz\tdBm\n${rows((hz, dbm) => `${written(hz, 'MHz')}\t${withMark(dbm)}\n`)}`),
  plain('line-of-units.csv', `Frequency,Amplitude\nHz,dBm\n${rows((hz, dbm) => `${hz},${withMark(dbm)}\n`)}`),
  plain('units-in-brackets-below-the-names.txt', `Frequency\tLevel\n[kHz]\t[dBm]\n${rows((hz, dbm) => `${written(hz, 'kHz')}\t${withMark(dbm)}\n`)}`),
  plain('underscores.csv', `Frequency_MHz,Level_dBm\n${rows((hz, dbm) => `${written(hz, 'MHz')},${withMark(dbm)}\n`)}`),
  plain('level-before-frequency.csv', `Level (dBm),Frequency (MHz)\n${rows((hz, dbm) => `${withMark(dbm)},${written(hz, 'MHz')}\n`)}`),
  plain('row-numbers-first.csv', `Point,Frequency (Hz),Amplitude (dBm)\n${rows((hz, dbm, at) => `${at + 1},${hz},${withMark(dbm)}\n`)}`),
  plain('row-numbers-without-a-name.csv', `,Frequency (Hz),Amplitude (dBm)\n${rows((hz, dbm, at) => `${at},${hz},${withMark(dbm)}\n`)}`),
  plain('limit-and-margin-beside.csv', `Frequency (MHz),Level (dBm),Limit (dBm),Margin (dB)\n${rows((hz, dbm) => `${written(hz, 'MHz')},${withMark(dbm)},-40.00,${withMark(-40 - dbm)}\n`)}`),
  plain('blank-lines-between-rows.csv', `Frequency [Hz],Level [dBm]\n\n${rows((hz, dbm, at) => `${hz},${dbm}\n${at % 3 === 0 ? '\n' : ''}`)}`),
  plain('semicolons-at-the-end.csv', `Frequency [Hz];Level [dBm];\n${rows((hz, dbm) => `${hz};${withMark(dbm, ',')};\n`)}`),
  plain('many-empty-cells-at-the-end.csv', `sep=;\nFrequency [Hz];Level [dBm];;;;\n${rows((hz, dbm) => `${hz};${withMark(dbm, ',')};;;;\n`)}`),
  plain('apostrophes-part-thousands.csv', `Frequency [Hz];Level [dBm]\n${rows((hz, dbm) => `${String(hz).replace(/\B(?=(\d{3})+$)/g, "'")};${withMark(dbm)}\n`)}`),
  plain('points-part-thousands.csv', `Frequenz [Hz];Pegel [dBm]\n${rows((hz, dbm) => `${String(hz).replace(/\B(?=(\d{3})+$)/g, '.')};${withMark(dbm, ',')}\n`)}`),
  plain('narrow-blanks-part-thousands.csv', `Fréquence [Hz];Niveau [dBm]\n${rows((hz, dbm) => `${String(hz).replace(/\B(?=(\d{3})+$)/g, '\u202f')};${withMark(dbm, ',')}\n`)}`),
  plain('exponents-with-comma.csv', `Frequenz [Hz];Pegel [dBm]\n${rows((hz, dbm) => `${(hz / 1e7).toFixed(4).replace('.', ',')}E+07;${withMark(dbm, ',')}\n`)}`),
  plain('columns-of-blanks.txt', `  Frequency (MHz)      Level (dBm)\n${rows((hz, dbm) => `${(hz / 1e6).toFixed(3).padStart(12)}${withMark(dbm).padStart(14)}\n`)}`),
  plain('columns-of-blanks-with-comma.txt', `Frequenz (MHz)      Pegel (dBm)\n${rows((hz, dbm) => `${(hz / 1e6).toFixed(3).replace('.', ',').padStart(12)}${withMark(dbm, ',').padStart(14)}\n`)}`),
  plain('falling-frequencies.csv', `Frequency [Hz],Level [dBm]\n${rows((hz, dbm) => `${hz},${dbm}\n`).trim().split('\n').reverse().join('\n')}`),
  plain('unit-in-every-cell.csv', `Frequency;Level\n${rows((hz, dbm) => `${written(hz, 'MHz')} MHz;${withMark(dbm)} dBm\n`)}`),
  plain('true-minus-signs.csv', `Frequency [Hz],Level [dBm]\n${rows((hz, dbm) => `${hz},${withMark(dbm).replace('-', '\u2212')}\n`)}`),
  plain('phase-beside.csv', `Frequency [Hz],Level [dBm],Phase [deg]\n${rows((hz, dbm, at) => `${hz},${dbm},${withMark((at * 37) % 360 - 180)}\n`)}`),
  {
    file: 'tabs-kilohertz-microvolts.txt', expected: { kind: 'read', sweeps: inDbuv },
    bytes: () => utf8(`Frequency [kHz]\tLevel [dBµV]\n${frequencyHz.map((hz, at) => `${written(hz, 'kHz')}\t${withMark(dbuv[at] ?? NaN)}\n`).join('')}`),
  },
  {
    file: 'utf-16-tabs-and-commas.txt', expected: { kind: 'read', sweeps: inDbuv },
    bytes: () => utf16(`Frequenz [MHz]\tPegel [dB\u03bcV]\r\n${frequencyHz.map((hz, at) => `${(hz / 1e6).toFixed(2).replace('.', ',')}\t${withMark(dbuv[at] ?? NaN, ',')}\r\n`).join('')}`, 'little'),
  },
  {
    file: 'utf-16-other-order-without-mark.csv', expected: { kind: 'read', sweeps, doubts: ['utf-16-without-mark'] },
    bytes: () => utf16(`Frequency [Hz];Level [dBm]\r\n${rows((hz, dbm) => `${hz};${withMark(dbm)}\r\n`)}`, 'big', false),
  },
  {
    file: 'four-thousand-and-one-points.csv', isBig: true, expected: { kind: 'read', sweeps: [dbmSweep(longHz, longLevel)] },
    bytes: () => utf8(`\ufeffFrequency [kHz],Level [dBm]\n${longHz.map((hz, at) => `${written(hz, 'kHz')},${withMark(longLevel[at] ?? NaN)}\n`).join('')}`),
  },
];
