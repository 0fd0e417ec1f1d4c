import type { Fixture } from './fixture.js';
import { utf8 } from './encode-text.js';
import { dbmSweep, type TrueSweep } from './true-sweep.js';

const asked = (file: string, code: string, text: string, more: { line?: number; answered?: readonly { choiceId: string; sweeps: readonly TrueSweep[] }[] } = {}): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'question', code, ...more } });
const read = (file: string, text: string, sweeps: readonly TrueSweep[], doubts: readonly string[] = []): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps, doubts } });
const head = 'Frequency [Hz],Level [dBm]\n';
const table = (pairs: readonly (readonly [number, number])[], names = head): string => names + pairs.map(([hz, dbm]) => `${hz},${dbm}\n`).join('');
const of = (pairs: readonly (readonly [number, number])[], factor = 1): TrueSweep => dbmSweep(pairs.map(([hz]) => hz * factor), pairs.map(([, dbm]) => dbm));
const rising: readonly (readonly [number, number])[] = Array.from({ length: 30 }, (_, at) => [1000 * (at + 1), -60 - at / 4] as const);
const linear: readonly (readonly [number, number])[] = rising.map(([hz], at) => [hz, (at + 1) / 1e6] as const);
const twice: readonly (readonly [number, number])[] = [[1000, -50], [2000, -51], [2000, -55], [3000, -52]];
const frequencies: readonly (readonly [number, number])[] = Array.from({ length: 30 }, (_, at) => [30 + at, -60 - at / 4] as const);

/** Files that are well-formed and cannot be true as they stand, or may be true in two ways. */
export const brokenPhysics: readonly Fixture[] = [
  asked('frequency-falls-once.csv', 'not-ascending', table([[1000, -50], [3000, -52], [2000, -51], [4000, -53]]), { line: 4, answered: [{ choiceId: 'sort', sweeps: [of([[1000, -50], [2000, -51], [3000, -52], [4000, -53]])] }] }),
  read('falling-sweep.csv', table([...rising].reverse()), [of(rising)], ['falling-sweep']),
  asked('frequency-twice.csv', 'duplicate-frequency', table(twice), { line: 4, answered: [{ choiceId: 'first', sweeps: [of([[1000, -50], [2000, -51], [3000, -52]])] }, { choiceId: 'highest', sweeps: [of([[1000, -50], [2000, -51], [3000, -52]])] }, { choiceId: 'mean', sweeps: [of([[1000, -50], [2000, -53], [3000, -52]])] }] }),
  { file: 'negative-frequency.csv', bytes: () => utf8(table([[-1000, -50], [2000, -51], [3000, -52]])), expected: { kind: 'refused', code: 'bad-frequency', line: 2 } },
  read('zero-frequency.csv', table([[0, -50], [2000, -51], [3000, -52]]), [of([[0, -50], [2000, -51], [3000, -52]])], ['zero-frequency']),
  asked('frequency-unit-missing.csv', 'unit-missing', table(frequencies, 'Frequency,Level [dBm]\n'), { line: 2, answered: [{ choiceId: 'MHz', sweeps: [of(frequencies, 1e6)] }, { choiceId: 'kHz', sweeps: [of(frequencies, 1e3)] }] }),
  asked('level-unit-missing.csv', 'unit-missing', table(rising, 'Frequency [Hz],Level\n'), { line: 2, answered: [{ choiceId: 'dBm', sweeps: [of(rising)] }, { choiceId: 'dB', sweeps: [{ ...of(rising), unit: 'dB' }] }] }),
  asked('both-units-missing.csv', 'unit-missing', table(frequencies, 'Frequency,Level\n')),
  asked('two-frequency-units.csv', 'unit-conflict', `X Axis Unit,Hz\n${table(frequencies, 'Frequency [MHz],Level [dBm]\n')}`, { answered: [{ choiceId: 'MHz', sweeps: [of(frequencies, 1e6)] }, { choiceId: 'Hz', sweeps: [of(frequencies)] }] }),
  asked('two-level-units.csv', 'unit-conflict', `Y Axis Unit,dBµV\n${table(rising)}`, { answered: [{ choiceId: 'dBm', sweeps: [of(rising)] }] }),
  asked('range-in-another-unit.csv', 'unit-conflict', `Start Frequency,30 kHz\nStop Frequency,59 kHz\n${table(frequencies, 'Frequency [MHz],Level [dBm]\n')}`),
  asked('linear-values-called-dbm.csv', 'implausible-level', table(linear)),
  asked('nine-hundred-dbm.csv', 'implausible-level', table(rising.map(([hz]) => [hz, 900] as const))),
  read('all-values-equal.csv', table(rising.map(([hz]) => [hz, -60] as const)), [of(rising.map(([hz]) => [hz, -60] as const))], ['all-equal']),
  read('gap-in-the-axis.csv', table([...rising, ...rising.map(([hz, dbm]) => [hz + 500_000, dbm] as const)]), [of([...rising, ...rising.map(([hz, dbm]) => [hz + 500_000, dbm] as const)])], ['wide-step']),
  read('terahertz.csv', table(rising.map(([hz, dbm]) => [hz, dbm] as const), 'Frequency [GHz],Level [dBm]\n'), [of(rising, 1e9)], ['frequency-implausible']),
  read('below-one-hertz.csv', table([[0.25, -60], [0.5, -61], [0.75, -62]]), [of([[0.25, -60], [0.5, -61], [0.75, -62]])], ['frequency-implausible']),
  asked('date-of-two-readings.csv', 'ambiguous-date', `Date,03/04/2026\n${table(rising)}`, { line: 1, answered: [{ choiceId: 'day-first', sweeps: [of(rising)] }, { choiceId: 'month-first', sweeps: [of(rising)] }] }),
  read('date-with-two-digits-of-the-year.csv', `Date,21/04/26 3:05 PM\n${table(rising)}`, [of(rising)], ['date-uncertain']),
  read('title-of-ten-thousand-letters.csv', `Title,${'long '.repeat(2000)}\n${table(rising)}`, [of(rising)]),
  read('serial-rounded-by-a-spreadsheet.csv', `Serial Number,1.23E+11\n${table(rising)}`, [of(rising)], ['serial-rounded']),
];
