import { decibelsFromFieldRatio } from '@leeside/units/decibels';
import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { axisHz, dbmSweep, kept, levels, withMark, written } from './true-sweep.js';

const frequencyHz = axisHz(800_000_000, 1_000_000, 15);
const [first, second, third] = [levels(15), levels(15, 8), levels(15, 21)];
const line = (at: number, traces: readonly (readonly number[])[], separator: string, mark: '.' | ',' = '.'): string =>
  [written(frequencyHz[at] ?? NaN, 'MHz', mark), ...traces.map((trace) => withMark(trace[at] ?? NaN, mark))].join(separator);
const rows = (traces: readonly (readonly number[])[], separator = ',', mark: '.' | ',' = '.'): string => frequencyHz.map((_, at) => `${line(at, traces, separator, mark)}\n`).join('');
const sweepsOf = (...traces: readonly (readonly number[])[]) => traces.map((trace) => dbmSweep(frequencyHz, trace));
const good = (file: string, text: string, ...traces: readonly (readonly number[])[]): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps: sweepsOf(...traces) } });

/** Several traces in one file, side by side or one after another, and tables that are none. */
export const severalTraces: readonly Fixture[] = [
  good('three-traces-side-by-side.csv', `Frequency (MHz),Trace 1 (dBm),Trace 2 (dBm),Trace 3 (dBm)\n${rows([first, second, third])}`, first, second, third),
  good('largest-average-smallest.csv', `Frequency [MHz];Max Hold [dBm];Average [dBm];Min Hold [dBm]\n${rows([third, second, first], ';', ',')}`, third, second, first),
  good('empty-traces-beside.csv', `Frequency (MHz),Trace A (dBm),Trace B (dBm),Trace C (dBm)\n${frequencyHz.map((_, at) => `${line(at, [first], ',')},,\n`).join('')}`, first),
  good('dashes-for-blank-traces.csv', `Frequency (MHz),Trace A (dBm),Trace B (dBm)\n${frequencyHz.map((_, at) => `${line(at, [first], ',')},---\n`).join('')}`, first),
  good('sentinels-for-blank-traces.csv', `Frequency (MHz),Trace A (dBm),Trace B (dBm),Trace C (dBm)\n${frequencyHz.map((_, at) => `${line(at, [first], ',')},-999.00,-200.00\n`).join('')}`, first),
  good('tables-one-after-another.csv', `Trace 1\nFrequency (MHz),Level (dBm)\n${rows([first])}\nTrace 2\nFrequency (MHz),Level (dBm)\n${rows([second])}`, first, second),
  good('limit-table-after-the-trace.csv', `Frequency (MHz),Level (dBm)\n${rows([first])}\nLimit Line 1\nFrequency (MHz),Limit (dBm)\n800,-40\n814,-40\n`, first),
  good('marker-table-before-the-trace.csv', `Instrument,ANALYSER-X\nMarker,Frequency (MHz),Level (dBm)\n1,803,-60.2\n2,811,-55.1\n\nFrequency (MHz),Level (dBm)\n${rows([first])}`, first),
  good('peak-list-after-the-trace.csv', `Frequency (MHz);Level (dBm)\n${rows([first], ';')}\nPeak list\nNo.;Frequency (MHz);Level (dBm)\n1;803;-60.2\n2;811;-55.1\n`, first),
  good('correction-table-before-the-trace.csv', `Transducer factors\nFrequency (MHz);Factor (dB)\n30;11.2\n1000;24.5\n\nMeasured data\nFrequency (MHz);Level (dBm)\n${rows([first], ';')}`, first),
  good('trace-names-above-the-units.csv', `Trace Name,Trace A,Trace B\nTrace Type,Max Hold,Clear Write\nDetector,Peak,RMS\nFrequency [MHz],[dBm],[dBm]\n${rows([first, second])}`, first, second),
  good('known-footer.csv', `Frequency (MHz),Level (dBm)\n${rows([first])}END\n`, first),
  {
    file: 'words-after-the-rows.csv', bytes: () => utf8(`Frequency (MHz),Level (dBm)\n${rows([first])}\nSaved by operator 3\nChecksum: 4A7F\n`),
    expected: { kind: 'read', sweeps: sweepsOf(first), doubts: ['lines-after-data'] },
  },
  {
    file: 'different-units-side-by-side.csv', bytes: () => utf8(`Frequency (MHz),Peak (dBm),Field (dBµV/m)\n${rows([first, second])}`),
    expected: { kind: 'read', sweeps: [dbmSweep(frequencyHz, first), { unit: 'dB\u00b5V/m', frequencyHz, level: second }] },
  },
  {
    file: 'volts-squared-away.csv', bytes: () => utf8(`Frequency (MHz),Level (mV)\n${frequencyHz.map((hz, at) => `${written(hz, 'MHz')},${(at + 1) / 8}\n`).join('')}`),
    expected: { kind: 'read', sweeps: [dbmSweep(frequencyHz, kept(frequencyHz.map((_, at) => (at + 1) / 8), 'mV'))], doubts: ['converted-at-impedance'] },
  },
  {
    file: 'seventy-five-ohms.csv', bytes: () => utf8(`Input Impedance,75 Ohm\nFrequency (MHz),Level (dBmV)\n${rows([first])}`),
    expected: { kind: 'read', sweeps: [dbmSweep(frequencyHz, kept(first, 'dBmV', 75))], settings: { impedanceOhm: 75 } },
  },
  {
    file: 'magnitude-and-phase.csv', bytes: () => utf8(`Freq(MHz),S21 Mag(dB),S21 Phase(deg)\n${rows([first, second])}`),
    expected: { kind: 'read', sweeps: [{ unit: 'dB', frequencyHz, level: first }] },
  },
  {
    file: 'real-and-imaginary.csv', bytes: () => utf8(`! a cable\n!\nBEGIN CH1_DATA\nFreq(Hz),"S21"(REAL),"S21"(IMAG)\n${frequencyHz.map((hz) => `${hz},3.0e-3,4.0e-3\n`).join('')}END\n`),
    expected: { kind: 'read', sweeps: [{ unit: 'dB', frequencyHz, level: frequencyHz.map(() => decibelsFromFieldRatio(Math.hypot(3e-3, 4e-3))) }] },
  },
];
