import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { axisHz, dbmSweep, kept, levels, withMark, type TrueSweep } from './true-sweep.js';

const count = 601;
const level = levels(count, 6);
const positive = level.map((value) => Math.round((value + 107) * 100) / 100);
const rows = (frequency: readonly (number | string)[], values: readonly number[], line: (frequency: string, level: string) => string): string =>
  frequency.map((value, at) => line(String(value), withMark(values[at] ?? NaN))).join('');
const good = (file: string, text: string, sweeps: readonly TrueSweep[]): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps } });

const binCentres = Array.from({ length: count }, (_, at) => (50e6 / 601) * (at + 0.5));
const wholeHz = axisHz(1_000_000, 5_000, count);
const zeroBased = axisHz(0, 500, count);
const thirds = Array.from({ length: count }, (_, at) => `${String(1_000_000 + Math.floor(at / 3))}${['', '.33333333333333333333', '.66666666666666666667'][at % 3]}`);
const tens = axisHz(10_000_000, 2_500_000, count);
const scientific = (value: number): string => value.toExponential(18).replace(/e([+-])(\d)$/, 'e$10$2');
const megahertz = Array.from({ length: count }, (_, at) => 470 + at * 0.535);

/** The layouts that are described by shape, at their full length. */
export const describedLayouts: readonly Fixture[] = [
  good('bin-centres-after-an-instruction.csv', `sep=;\nType;ANALYSER-X;\nDate;02.Feb 2020;\nStart;0.000000;Hz;\nStop;50000000.000000;Hz;\nRBW;100000.000000;Hz;\nx-Unit;Hz;\ny-Unit;dBm;\nTrace Mode;MAXHOLD;\nValues;${count};\n${rows(binCentres, level, (hz, dbm) => `${hz};${dbm};\n`)}`, [dbmSweep(binCentres, level)]),
  good('sections-with-the-level-first.csv', `Sweep 1,1/2/2020 09:00:00\n[Global Parameters]\nInput Bandwidth,0,Hz\n,40000000,Hz\n[Marker M0]\nFrequency,---,,\nAmplitude,---,,\n[Trace]\nTrace 1,,dBuVPerMeter,-0.0001,0.0003\nNumberPoints,${count}\nXStart,1000000,Hz\nXStop,1000200,Hz\n${rows(thirds, positive, (hz, dbuv) => `${dbuv},${hz}\n`)}`, [{ unit: 'dB\u00b5V/m', frequencyHz: thirds.map(Number), level: positive }]),
  good('one-comment-names-the-columns.txt', `# f[Hz], a[dB]\n${tens.map((hz, at) => `${scientific(hz)},${scientific(positive[at] ?? NaN)}\n`).join('')}`, [{ unit: 'dB', frequencyHz: tens, level: positive }]),
  good('begin-and-end.csv', `! FILETYPE CSV\n! TIMESTAMP Monday, 3 February 2020 10:00:00\n! CORRECTION1 OFF\n! DATA Freq,S21\n! FREQ UNIT Hz\n! DATA UNIT dB\nBEGIN\n${rows(wholeHz, level, (hz, db) => `${hz},${db}\n`)}END\n`, [{ unit: 'dB', frequencyHz: wholeHz, level }]),
  { file: 'bare-numbers.txt', bytes: () => utf8(rows(megahertz.map((value) => value.toFixed(3)), level, (mhz, dbm) => `${mhz}\t${dbm}\n`)), expected: { kind: 'question', code: 'unit-missing' } },
  good('handheld-with-padded-numbers.csv', `Model Type: HANDY1,\nTrace Type: Live,\nStart Frequency: 0100.0000 MHz,\nStop Frequency: 0101.5000 MHz,\nRBW:    15kHz,\nReference Level:   -20dBm,\nFixed Offset: Off,-010.0dB,\n${level.map((dbm, at) => `${(100 + at * 0.0025).toFixed(4).padStart(9, '0')},-${withMark(-dbm, '.', 2).padStart(6, '0')}\n`).join('')}`, [dbmSweep(Array.from({ length: count }, (_, at) => 100_000_000 + at * 2_500), level)]),
  good('handheld-of-another-firmware.csv', `Trace Type: Live,\nRBW:    15kHz,\nReference Level:   -20dBm,\n${level.map((dbm, at) => `${(100 + at * 0.0025).toFixed(4).padStart(9, '0')} MHz,-${withMark(-dbm).padStart(6, '0')}\n`).join('')}`, [dbmSweep(Array.from({ length: count }, (_, at) => 100_000_000 + at * 2_500), level)]),
  good('extra-blanks-in-the-option-line.s2p', `#  HZ   S   DB   R     50.00 \n! Two ports - version 1\n! Measurements: S11 S21 S12 S22 \n! \n${tens.map((hz, at) => ` ${(hz / 1e7).toFixed(6)}E7   -2.10E1  1.0E2  ${withMark((level[at] ?? NaN) / 10, '.', 4)}E1  5.5  -1.001E1  5.5  -2.2E1  9.0E1 \n`).join('')}`, [{ unit: 'dB', frequencyHz: tens, level }, { unit: 'dB', frequencyHz: tens, level: tens.map(() => -10.01) }]),
  good('row-numbers-and-glued-units.csv', `Title:,Trace 1,\nCenter Frequency:,${tens[300]},Hz\nResolution Bandwidth:,300,Hz\nNum Points:,${count},\n ,,\nNo.,Frequency,Amplitude\n${tens.map((hz, at) => `${at + 1},${hz}.000000Hz,${(level[at] ?? NaN).toExponential(9).replace(/e([+-])(\d)$/, 'e$10$2')}dBm\n`).join('').trimEnd()}`, [dbmSweep(tens, level)]),
  good('greek-letter-and-blank-traces.csv', `X Axis Unit,Hz\nY Axis Unit,dB\u03bcV\nNumber of Points,${count}\nMarker,1,2,3\nMarker X Axis,,,\nMarker Ampt,,,\nTrace Name,Trace A\nTrace Type,Max Hold\nDetector,Peak\nTrace Data\n${rows(zeroBased, positive, (hz, dbuv) => `${hz},${dbuv}\n`)}Trace Name,Trace B\nTrace Type,Blank\nTrace Name,Trace C\nTrace Type,Blank\n`, [dbmSweep(zeroBased, kept(positive, 'dB\u00b5V'))]),
  { file: 'marker-contradicts-the-unit.csv', bytes: () => utf8(`X Axis Unit,Hz\nY Axis Unit,dB\u03bcV\nNumber of Points,${count}\nMarker,1,2,3\nMarker X Axis,500.00,,\nMarker Ampt,${withMark((positive[1] ?? NaN) - 107)},,\nTrace Name,Trace A\nTrace Type,Max Hold\nTrace Data\n${rows(zeroBased, positive, (hz, dbuv) => `${hz},${dbuv}\n`)}`), expected: { kind: 'question', code: 'unit-conflict' } },
  good('zero-bytes-and-a-default-unit.csv', `File:\0,/disk/TST.CSV\0\nSystem Parameter:\0,Default Unit:dBm/Hz/s\0\nStart Freq\0,1000000.000000\0,Stop Freq\0,4000000.000000\0\nVBW\0,10000.000000\0,AUTO\0,RBW\0,10000.000000\0,MAN\0\n\0\nTrace Data:(Unit:dBuV)\0\nFrequency(Hz)\0,Trace1(VIEW)\0,\0\n${rows(wholeHz, positive, (hz, dbuv) => `${hz}.000000\0,${dbuv}\0,\0\n`)}`, [dbmSweep(wholeHz, kept(positive, 'dB\u00b5V'))]),
  good('prose-and-a-zero-column.txt', `#S21 Log Magnitude Measured 2/2/20\n#DUT: type AB|C-100, S/N=7, nominal CF=100MHz\n#As measured: CF=0.101GHz, bandpass=12.5MHz, loss=-.5dB\n#601 point scan, 10MHz-1.51GHz\n\n${tens.map((hz, at) => `${hz.toExponential(8).replace('e+', 'E+0')}, ${(level[at] ?? NaN).toExponential(8).replace('e+', 'E+0')},  0.00000000E+00\n`).join('')}`, [{ unit: 'dB', frequencyHz: tens, level }]),
];
