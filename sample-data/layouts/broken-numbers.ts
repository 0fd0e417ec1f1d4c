import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { dbmSweep, type TrueSweep } from './true-sweep.js';

const refused = (file: string, code: string, text: string, line?: number): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'refused', code, ...(line === undefined ? {} : { line }) } });
const read = (file: string, text: string, sweeps: readonly TrueSweep[], doubts: readonly string[] = []): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps, doubts } });
const head = 'Frequency [Hz],Level [dBm]\n';
const count = 250;
const frequencyHz = Array.from({ length: count }, (_, at) => 1000 * (at + 1));
const level = frequencyHz.map((_, at) => -50 - at / 8);
/** A table with one cell of the level replaced. */
const withCell = (cell: string, at = 88): string => head + frequencyHz.map((hz, row) => `${hz},${row === at ? cell : level[row]}\n`).join('');
const without = (...gone: readonly number[]): TrueSweep => dbmSweep(frequencyHz.filter((_, at) => !gone.includes(at)), level.filter((_, at) => !gone.includes(at)));
const small = (lines: readonly string[]): string => head + lines.map((line) => `${line}\n`).join('');

/** Files with numbers that are none, that are too large, or that may be read in two ways. */
export const brokenNumbers: readonly Fixture[] = [
  { file: 'comma-before-three-digits.csv', bytes: () => utf8('Frequency [MHz];Level [dBm]\n1,000;-40,500\n2,000;-41,250\n'), expected: { kind: 'question', code: 'ambiguous-decimal', answered: [{ choiceId: 'decimal', sweeps: [dbmSweep([1e6, 2e6], [-40.5, -41.25])] }, { choiceId: 'thousands', sweeps: [dbmSweep([1e9, 2e9], [-40500, -41250])] }] } },
  read('comma-decided-by-another-value.csv', 'Frequency [MHz];Level [dBm]\n1,000;-40,500\n2,000;-41,5\n', [dbmSweep([1e6, 2e6], [-40.5, -41.5])]),
  { file: 'comma-parts-and-marks.csv', bytes: () => utf8('Frequency [MHz],Level [dBm]\n1,5,-60,2\n2,5,-61,4\n3,5,-62,8\n'), expected: { kind: 'refused', code: 'ambiguous-decimal', line: 2 } },
  { file: 'comma-parts-and-marks-without-names.csv', bytes: () => utf8('1,5,-60,2\n2,5,-61,4\n3,5,-62,8\n'), expected: { kind: 'refused', code: 'ambiguous-decimal', line: 1 } },
  ...['NaN', 'Inf', '-1.#IND', '----', 'OVLD', '<-120', '', '***'].map((word, at) => read(`no-value-${at + 1}.csv`, withCell(word), [without(88)], ['no-value'])),
  ...['9.91E+37', '9.9e37', '1E+40', '-1e40'].map((word, at) => read(`marker-of-no-value-${at + 1}.csv`, withCell(word), [without(88)], ['no-value'])),
  { file: 'many-gaps.csv', bytes: () => utf8(head + frequencyHz.map((hz, at) => `${hz},${at % 10 === 0 ? '----' : level[at]}\n`).join('')), expected: { kind: 'question', code: 'many-gaps', answered: [{ choiceId: 'leave-out', sweeps: [without(...frequencyHz.map((_, at) => at).filter((at) => at % 10 === 0))] }] } },
  refused('too-large-a-number.csv', 'number-out-of-range', withCell('1e400'), 90),
  read('too-small-a-number.csv', withCell('1e-400'), [dbmSweep(frequencyHz, level.map((value, at) => (at === 88 ? 0 : value)))], ['number-underflow']),
  read('every-good-spelling.csv', small(['1D3,1E+1', '+2000.,+5.', '3000,.5', '4e3,\u22127.25', '5.0d+03,-0', '06000,-007.5']), [dbmSweep([1000, 2000, 3000, 4000, 5000, 6000], [10, 5, 0.5, -7.25, -0, -7.5])]),
  read('long-mantissas.csv', small(['1000.000000000000000000000000000,-50.12345678901234567890', '2000.00000000000000000000000001,-51']), [dbmSweep([1000, 2000], [-50.12345678901234567890, -51])]),
  refused('hexadecimal.csv', 'bad-number', withCell('0x10'), 90),
  refused('underscores-in-numbers.csv', 'bad-number', withCell('1_000'), 90),
  refused('fraction.csv', 'bad-number', withCell('1/3'), 90),
  refused('formula.csv', 'bad-number', withCell('=1+1'), 90),
  refused('function.csv', 'bad-number', withCell('@SUM(A1)'), 90),
  refused('sum-of-numbers.csv', 'bad-number', withCell('-2+3'), 90),
  refused('two-decimal-marks.csv', 'bad-number', withCell('-51.2.3'), 90),
  refused('letters-in-a-number.csv', 'bad-number', withCell('-5l.2'), 90),
  refused('exponent-without-digits.csv', 'bad-number', withCell('-5.1e'), 90),
  refused('unit-of-another-kind.csv', 'bad-number', withCell('-51kg'), 90),
  refused('other-unit-in-one-cell.csv', 'unit-conflict', withCell('56dBuV'), 90),
  read('same-unit-in-one-cell.csv', withCell('-61dBm'), [dbmSweep(frequencyHz, level)], []),
];
