import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { dbmSweep, type TrueSweep } from './true-sweep.js';

const refused = (file: string, code: string, text: string, line?: number): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'refused', code, ...(line === undefined ? {} : { line }) } });
const asked = (file: string, code: string, text: string, line?: number): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'question', code, ...(line === undefined ? {} : { line }) } });
const read = (file: string, text: string, sweeps: readonly TrueSweep[], doubts: readonly string[] = []): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps, doubts } });
const head = 'Frequency [Hz],Level [dBm]\n';
const row = (at: number): string => `${1000 * at},${-50 - at}\n`;
const rows = (from: number, to: number): string => Array.from({ length: to - from + 1 }, (_, at) => row(from + at)).join('');
const sweep = (from: number, to: number): TrueSweep => dbmSweep(Array.from({ length: to - from + 1 }, (_, at) => 1000 * (from + at)), Array.from({ length: to - from + 1 }, (_, at) => -50 - from - at));

/** Files whose lines do not hold together. */
export const brokenStructure: readonly Fixture[] = [
  refused('names-without-rows.csv', 'no-data', head),
  refused('words-alone.txt', 'no-data', 'Dear all,\nplease find the trace attached.\nRegards\n'),
  read('one-row.csv', head + row(1), [sweep(1, 1)], ['one-point']),
  read('two-rows.csv', head + rows(1, 2), [sweep(1, 2)]),
  refused('time-axis.csv', 'zero-span', `Time (s),Level (dBm)\n0.000,-50\n0.001,-51\n0.002,-50.5\n`),
  refused('zero-span.csv', 'zero-span', `Center Frequency,100 MHz\nSpan,0 Hz\nPoints,3\nUnit,dBm\n-50\n-51\n-50.5\n`),
  refused('start-is-stop.csv', 'zero-span', `Start Frequency,100 MHz\nStop Frequency,100 MHz\nPoints,3\nUnit,dBm\n-50\n-51\n-50.5\n`),
  refused('short-row.csv', 'ragged-row', `Frequency [Hz],Trace 1 [dBm],Trace 2 [dBm]\n1000,-50,-60\n2000,-51,-61\n3000\n4000,-53,-63\n`, 4),
  refused('long-row.csv', 'ragged-row', `${head + rows(1, 3)}4000,-54,-99\n${rows(5, 8)}`, 5),
  refused('delimiter-changes.csv', 'mixed-delimiters', `${head + rows(1, 4)}5000;-55\n6000;-56\n7000;-57\n`, 6),
  refused('unclosed-quote.csv', 'unclosed-quote', `${head}1000,-50\n"2000,-51\n3000,-52\n4000,-53\n`, 3),
  refused('five-hundred-columns.csv', 'too-many-columns', `${Array.from({ length: 3 }, (_, at) => [1000 * at, ...Array.from({ length: 499 }, (__, column) => -50 - column)].join(',')).join('\n')}\n`),
  refused('endless-preamble.csv', 'preamble-too-long', `${Array.from({ length: 600 }, (_, at) => `Setting ${at},on\n`).join('')}${head}${rows(1, 3)}`),
  refused('field-too-long.csv', 'field-too-long', `${head}1000,-50\n2000,-51${'0'.repeat(1100)}\n3000,-52\n`, 3),
  refused('thirty-three-traces.csv', 'too-many-traces', `Frequency [Hz],${Array.from({ length: 33 }, (_, at) => `Trace ${at + 1} [dBm]`).join(',')}\n${[1, 2, 3].map((at) => [1000 * at, ...Array.from({ length: 33 }, (_, trace) => -50 - trace - at)].join(',')).join('\n')}\n`),
  asked('fewer-rows-than-stated.csv', 'point-count-mismatch', `Number of Points,10\n${head}${rows(1, 8)}`, 1),
  asked('more-rows-than-stated.csv', 'point-count-mismatch', `Number of Points,5\n${head}${rows(1, 8)}`, 1),
  refused('no-rows-of-those-stated.csv', 'no-data', `Number of Points,5\n${head}`),
  { file: 'last-row-cut.csv', bytes: () => utf8(`Number of Points,5\n${head}${rows(1, 4)}5000`), expected: { kind: 'question', code: 'maybe-truncated', line: 7, answered: [{ choiceId: 'without-last-row', sweeps: [sweep(1, 4)] }] } },
  asked('range-contradicts-rows.csv', 'range-mismatch', `Start Frequency,2000 Hz\nStop Frequency,20000 Hz\n${head}${rows(1, 8)}`),
  asked('setting-twice.csv', 'duplicate-setting', `RBW,10 kHz\nVBW,30 kHz\nRBW,100 kHz\n${head}${rows(1, 8)}`, 3),
  asked('no-names-no-units.csv', 'unit-missing', rows(1, 8)),
  asked('equal-names.csv', 'needs-mapping', `Value,Value\n${rows(1, 8)}`),
  asked('lines-between-the-rows.csv', 'data-after-break', `${head}${rows(1, 4)}Operator changed the antenna\n${rows(5, 8)}`, 6),
  read('garbage-after-rows.csv', `${head}${rows(1, 8)}\nSigned by operator 4\nroom 12\n`, [sweep(1, 8)], ['lines-after-data']),
  read('equal-trace-names.csv', `Frequency [Hz],Trace [dBm],Trace [dBm]\n1000,-50,-60\n2000,-51,-61\n`, [dbmSweep([1000, 2000], [-50, -51]), dbmSweep([1000, 2000], [-60, -61])], ['same-name-twice']),
  read('grids-that-differ.csv', `Trace 1\n${head}${rows(1, 8)}\nTrace 2\n${head}${rows(2, 5)}`, [sweep(1, 8), sweep(2, 5)], ['grids-differ']),
  asked('three-unnamed-columns.csv', 'unit-missing', '1000,-50,-60\n2000,-51,-61\n3000,-52,-62\n'),
  refused('rows-without-axis.csv', 'frequency-missing', 'Level [dBm]\n-50\n-51\n-52.5\n'),
  refused('index-without-range.csv', 'frequency-missing', 'Point,Level [dBm]\n1,-50\n2,-51\n3,-52.5\n'),
];
