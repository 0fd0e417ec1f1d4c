import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { axisHz, dbmSweep, levels, withMark, written } from './true-sweep.js';

const frequencyHz = axisHz(10_000_000, 2_000_000, 40);
const level = levels(40, 4);
const sweeps = [dbmSweep(frequencyHz, level)];
const good = (file: string, text: string): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps } });
const rows = (separator = ','): string => frequencyHz.map((hz, at) => `${hz}${separator}${withMark(level[at] ?? NaN)}\n`).join('');
const listOf = (values: readonly (number | string)[], separator: string): string => values.join(separator);
const body = `Frequency [Hz],Level [dBm]\n${rows()}`;
const bins = (lowHz: number, seed: number): number[] => levels(5, lowHz / 5e6 + seed);
const pieces = [0, 2, 1, 3].map((piece) => 400_000_000 + piece * 5_000_000);
const centres = axisHz(400_500_000, 1_000_000, 20);
const binLevels = (seed: number): number[] => [...pieces].sort((one, other) => one - other).flatMap((lowHz) => bins(lowHz, seed));
const piece = (lowHz: number, seed: number, clock: string, repeatsLast: boolean): string => {
  const values = bins(lowHz, seed).map((value) => withMark(value));
  return `2026-02-03, ${clock}, ${lowHz}, ${lowHz + 5_000_000}, 1000000.00, 20, ${[...values, ...(repeatsLast ? values.slice(-1) : [])].join(', ')}\n`;
};
const relative = (seed: number) => ({ unit: 'dB' as const, frequencyHz: centres, level: binLevels(seed) });

/** Shapes that are no plain table: on the side, in rows of bins, behind prefixes, padded. */
export const oddShapes: readonly Fixture[] = [
  good('on-its-side.csv', `Frequency [Hz],${listOf(frequencyHz, ',')}\nLevel [dBm],${listOf(level, ',')}\n`),
  good('on-its-side-with-settings.csv', `RBW;10 kHz\nDetektor;Spitze\nFrequenz [MHz];${listOf(frequencyHz.map((hz) => written(hz, 'MHz', ',')), ';')}\nPegel [dBm];${listOf(level.map((value) => withMark(value, ',')), ';')}\n`),
  good('on-its-side-unit-in-a-cell.csv', `Frequency,Hz,${listOf(frequencyHz, ',')}\nLevel,dBm,${listOf(level, ',')}\n`),
  good('block-of-stated-length.csv', `#3${String(body.length).padStart(3, '0')}${body}\n`),
  good('block-of-open-length.csv', `#0${body}\n`),
  good('zero-bytes-after-cells.csv', `Frequency(Hz)\0,Trace1(dBm)\0,\0\n${frequencyHz.map((hz, at) => `${hz}\0,${withMark(level[at] ?? NaN)}\0,\0\n`).join('')}`),
  good('zero-padded-numbers.csv', `Unit: dBm,\n${frequencyHz.map((hz, at) => `${(hz / 1e6).toFixed(4).padStart(9, '0')} MHz,-${withMark(-(level[at] ?? NaN)).padStart(6, '0')}\n`).join('')}`),
  good('third-column-zero.csv', `# S/A trace, values in dBm, frequencies in Hz\n${frequencyHz.map((hz, at) => `${hz}, ${withMark(level[at] ?? NaN)}, 0.00\n`).join('')}`),
  good('time-of-each-row-first.csv', `Time,Frequency (Hz),Level (dBm)\n${frequencyHz.map((hz, at) => `10:11:${String(at).padStart(2, '0')},${hz},${withMark(level[at] ?? NaN)}\n`).join('')}`),
  good('status-word-last.csv', `Frequency (Hz),Level (dBm),Status\n${frequencyHz.map((hz, at) => `${hz},${withMark(level[at] ?? NaN)},${at % 5 === 0 ? 'check' : 'ok'}\n`).join('')}`),
  good('bars-and-borders.txt', `| Frequency (Hz) | Level (dBm) |\n|----------------|-------------|\n${frequencyHz.map((hz, at) => `| ${hz} | ${withMark(level[at] ?? NaN)} |\n`).join('')}`),
  good('comma-and-blank.txt', `Frequency (Hz), Level (dBm)\n${frequencyHz.map((hz, at) => `${hz}, ${withMark(level[at] ?? NaN)}\n`).join('')}`),
  good('numbers-in-quotes-of-a-spreadsheet.csv', `sep=,\n"Frequency (Hz)","Level (dBm)"\n${frequencyHz.map((hz, at) => `"${hz}","${withMark(level[at] ?? NaN)}"\n`).join('')}`),
  good('names-over-two-lines-in-quotes.csv', `"Frequency\n(Hz)","Level\n(dBm)"\n${rows()}`),
  good('carriage-returns-alone.csv', body.replaceAll('\n', '\r')),
  good('mixed-line-ends.csv', body.split('\n').map((text, at) => `${text}${at % 3 === 0 ? '\r\n' : '\n'}`).join('')),
  good('control-z-at-the-end.csv', `${body}\u001a`),
  {
    file: 'rows-of-bins.csv', expected: { kind: 'read', sweeps: [relative(1)] },
    bytes: () => utf8(pieces.map((lowHz) => piece(lowHz, 1, '09:00:00.100', false)).join('')),
  },
  {
    file: 'rows-of-bins-two-sweeps-last-bin-twice.csv', expected: { kind: 'read', sweeps: [relative(1), relative(7)] },
    bytes: () => utf8([1, 7].flatMap((seed) => pieces.map((lowHz) => piece(lowHz, seed, `09:00:0${seed}`, true))).join('')),
  },
  {
    file: 'values-over-range.csv', bytes: () => utf8(`Frequency [Hz],Level [dBm]\n${frequencyHz.map((hz, at) => `${hz},${at === 7 ? '9.91E+37' : withMark(level[at] ?? NaN)}\n`).join('')}`),
    expected: { kind: 'question', code: 'many-gaps' },
  },
];
