import { powerOfTen } from '@leeside/units/logarithm';
import type { Fixture } from './fixture.js';
import { utf16, utf8 } from './encode-text.js';
import { axisHz, dbmSweep, kept, levels, withMark } from './true-sweep.js';

const count = 601;
const frequencyHz = axisHz(100_000_000, 1_500_000, count);
const level = levels(count, 2);
const sweeps = [dbmSweep(frequencyHz, level)];
const column = (mark: '.' | ',' = '.'): string => level.map((value) => `${withMark(value, mark)}\n`).join('');
const good = (file: string, text: string): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps } });
const dbuv = level.map((value) => Math.round((value + 107) * 100) / 100);
const decades = Array.from({ length: 61 }, (_, at) => 1e6 * powerOfTen(at / 20));

/** Levels without a frequency column: start and stop, or centre and span, and the number of points stand before them. */
export const levelsAlone: readonly Fixture[] = [
  good('start-stop-points.csv', `Start Frequency,100 MHz\nStop Frequency,1000 MHz\nPoints,601\nUnit,dBm\nRBW,100 kHz\n${column()}`),
  good('start-stop-points-in-hertz.csv', `Start Freq,1.000000000E+08,Hz\nStop Freq,1.000000000E+09,Hz\nSweep Points,601\nAmplitude Unit,dBm\nTrace Data\n${column()}`),
  good('centre-span-points.txt', `Center = 550 MHz\nSpan = 900 MHz\nNumber of points = 601\nY-Unit = dBm\n\n${column()}`),
  good('named-level-column.csv', `# Start: 0.1 GHz\n# Stop: 1 GHz\n# Points: 601\nAmplitude [dBm]\n${column()}`),
  good('unit-of-range-in-its-own-line.csv', `Start,100\nStop,1000\nFrequency Unit,MHz\nPoints,601\nLevel Unit,dBm\nLevel\n${column()}`),
  good('decimal-comma-column.csv', `Startfrequenz;100 MHz\nStoppfrequenz;1 GHz\nMesspunkte;601\nEinheit;dBm\nPegel\n${column(',')}`),
  good('numbered-levels.csv', `Start Frequency,100000000,Hz\nStop Frequency,1000000000,Hz\nNumber of Points,601\nPoint,Level (dBm)\n${level.map((value, at) => `${at + 1},${withMark(value)}\n`).join('')}`),
  good('numbered-from-zero-without-names.csv', `Start Frequency,100000000,Hz\nStop Frequency,1000000000,Hz\nNumber of Points,601\nY Unit,dBm\n${level.map((value, at) => `${at},${withMark(value)}\n`).join('')}`),
  good('all-levels-on-one-line.txt', `Start Frequency: 100 MHz\nStop Frequency: 1000 MHz\nPoints: 601\nUnit: dBm\n${level.map((value) => withMark(value)).join(',')}\n`),
  good('trailing-commas.csv', `Start Frequency,100 MHz,\nStop Frequency,1000 MHz,\nPoints,601,\nUnit,dBm,\n${level.map((value) => `${withMark(value)},\n`).join('')}`),
  {
    file: 'two-level-columns.csv', expected: { kind: 'read', sweeps: [...sweeps, dbmSweep(frequencyHz, levels(count, 9))] },
    bytes: () => utf8(`Start Frequency,100 MHz\nStop Frequency,1000 MHz\nPoints,601\nTrace 1 (dBm),Trace 2 (dBm)\n${level.map((value, at) => `${withMark(value)},${withMark(levels(count, 9)[at] ?? NaN)}\n`).join('')}`),
  },
  {
    file: 'utf-16-microvolts.csv', expected: { kind: 'read', sweeps: [dbmSweep(frequencyHz, kept(dbuv, 'dBµV'))] },
    bytes: () => utf16(`Start Frequency\t100 MHz\r\nStop Frequency\t1000 MHz\r\nPoints\t601\r\nLevel (dBµV)\r\n${dbuv.map((value) => `${withMark(value)}\r\n`).join('')}`, 'big'),
  },
  {
    file: 'steps-of-a-decade.csv', expected: { kind: 'read', sweeps: [dbmSweep(decades, levels(61))] },
    bytes: () => utf8(`Start Frequency,1 MHz\nStop Frequency,1 GHz\nSweep Type,Log\nPoints,61\nUnit,dBm\n${levels(61).map((value) => `${withMark(value)}\n`).join('')}`),
  },
];
