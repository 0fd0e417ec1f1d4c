import { decibelsFromFieldRatio } from '@leeside/units/decibels';
import type { Fixture } from './fixture.js';
import { latin1, utf8 } from './encode-text.js';
import type { TrueSweep } from './true-sweep.js';

const axis = [1e9, 1.5e9, 2e9];
const db = (frequencyHz: readonly number[], level: readonly number[]): TrueSweep => ({ unit: 'dB', frequencyHz, level });
const voltageDb = (ratio: number): number => decibelsFromFieldRatio(ratio);
const good = (file: string, text: string, sweeps: readonly TrueSweep[], doubts?: readonly string[]): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps, ...(doubts === undefined ? {} : { doubts }) } });
/** A whole matrix of n ports in dB, element row.column at −(10·row + column) dB, an angle of 0. */
const matrixRow = (ports: number, row: number): string => Array.from({ length: ports }, (_, at) => `-${row}${at + 1}.5 0`).join(' ');
const matrix = (ports: number): string => Array.from({ length: ports }, (_, at) => matrixRow(ports, at + 1)).join('\n  ');
const all = (order: readonly (readonly [number, number])[]): TrueSweep[] => order.map(([row, column]) => db(axis, axis.map(() => -Number(`${row}${column}.5`))));

/** Touchstone 1.1 and 2.0 in the spellings that are met. Transmission parameters become sweeps, S21 first. */
export const touchstoneFiles: readonly Fixture[] = [
  good('decibels-gigahertz.s2p', '! a pad\n# GHz S DB R 50\n1 -20 10 -3.25 80 -3.5 80 -21 9\n1.5 -20 10 -3.75 80 -4 80 -21 9\n2 -20 10 -4.25 80 -4.5 80 -21 9\n', [db(axis, [-3.25, -3.75, -4.25]), db(axis, [-3.5, -4, -4.5])]),
  good('magnitudes-by-default.s2p', '# MHz\n1000 0.1 10 0.5 80 0.25 80 0.1 9\n1500 0.1 10 0.05 80 0.25 80 0.1 9\n2000 0.1 10 0.005 80 0.25 80 0.1 9\n', [db(axis, [0.5, 0.05, 0.005].map(voltageDb)), db(axis, [0.25, 0.25, 0.25].map(voltageDb))]),
  good('no-option-line.s2p', '! everything by default: GHz, S, MA, 50 ohms\n1 0.1 10 0.5 80 0.25 80 0.1 9\n1.5 0.1 10 0.05 80 0.25 80 0.1 9\n2 0.1 10 0.005 80 0.25 80 0.1 9\n', [db(axis, [0.5, 0.05, 0.005].map(voltageDb)), db(axis, [0.25, 0.25, 0.25].map(voltageDb))]),
  good('options-out-of-order.s2p', '# r 50.00 ri s khz\n\t1e6\t0 0\t3e-3 4e-3\t0 1\t0 0 ! 1 GHz\n\t1.5e6\t0 0\t3e-3 4e-3\t0 1\t0 0\n\t2e6\t0 0\t3e-3 4e-3\t0 1\t0 0\n', [db(axis, axis.map(() => voltageDb(Math.hypot(3e-3, 4e-3)))), db(axis, [0, 0, 0])]),
  good('noise-rows-after-the-network.s2p', '# GHz S DB R 50\n1 -20 10 -3.25 80 -3.5 80 -21 9\n1.5 -20 10 -3.75 80 -4 80 -21 9\n2 -20 10 -4.25 80 -4.5 80 -21 9\n! noise\n0.7 1.2 0.3 40 0.2\n1.1 1.3 0.3 41 0.2\n', [db(axis, [-3.25, -3.75, -4.25]), db(axis, [-3.5, -4, -4.5])], ['noise-section']),
  good('one-port.s1p', '# GHz S DB R 50\n1 -20 10\n1.5 -21 10\n2 -22.5 10\n', [db(axis, [-20, -21, -22.5])], ['reflection-only']),
  good('three-ports.s3p', `# GHz S DB R 50\n${['1', '1.5', '2'].map((ghz) => `${ghz} ${matrix(3)}\n`).join('')}`, all([[2, 1], [3, 1], [3, 2], [1, 2], [1, 3], [2, 3]])),
  good('four-ports.s4p', `# GHz S DB R 75\n! four pairs a line\n${['1', '1.5', '2'].map((ghz) => `${ghz} ${matrix(4)}\n`).join('')}`, all([[2, 1], [3, 1], [3, 2], [4, 1], [4, 2], [4, 3], [1, 2], [1, 3], [1, 4], [2, 3], [2, 4], [3, 4]])),
  good('capitals-and-a-comment-on-each-row.S2P', '!COMMENT\n# HZ S RI R 50\n1.0E+009 0 0 1e-003 0 0 1 0 0 ! Port Impedance 50 0 50 0\n1.5E+009 0 0 1e-003 0 0 1 0 0\n2.0E+009 0 0 1e-003 0 0 1 0 0\n', [db(axis, axis.map(() => voltageDb(1e-3))), db(axis, [0, 0, 0])]),
  good('version-2-in-the-usual-order.s2p', '[Version] 2.0\n# GHz S DB R 50\n[Number of Ports] 2\n[Two-Port Data Order] 21_12\n[Number of Frequencies] 3\n[Reference]\n50 50\n[Begin Information]\nby hand\n[End Information]\n[Network Data]\n1 -20 0 -3 0 -4 0 -20 0\n1.5 -20 0 -3 0 -4 0 -20 0\n2 -20 0 -3 0 -4 0 -20 0\n[End]\n', [db(axis, [-3, -3, -3]), db(axis, [-4, -4, -4])]),
  good('version-2-by-rows.ts', '[Version] 2.0\n# MHz S DB R 50\n[Number of Ports] 2\n[Two-Port Data Order] 12_21\n[Number of Frequencies] 3\n[Matrix Format] Full\n[Network Data]\n1000 -20 0 -4 0 -3 0 -20 0\n1500 -20 0 -4 0 -3 0 -20 0\n2000 -20 0 -4 0 -3 0 -20 0\n[Noise Data]\n1000 1 0 0 1\n[End]\n', [db(axis, [-3, -3, -3]), db(axis, [-4, -4, -4])]),
  good('version-2-lower-half.ts', '[Version] 2.0\n# GHz S DB R 50\n[Number of Ports] 3\n[Number of Frequencies] 3\n[Matrix Format] Lower\n[Network Data]\n1 -11.5 0\n-21.5 0 -22.5 0\n-31.5 0 -32.5 0 -33.5 0\n1.5 -11.5 0\n-21.5 0 -22.5 0\n-31.5 0 -32.5 0 -33.5 0\n2 -11.5 0\n-21.5 0 -22.5 0\n-31.5 0 -32.5 0 -33.5 0\n[End]\n', all([[2, 1], [3, 1], [3, 2], [2, 1], [3, 1], [3, 2]])),
  { file: 'western-letters-in-comments.s2p', bytes: () => latin1('! Prüfling, 25 °C\n# GHz S DB R 50\n1 -20 10 -3.25 80 -3.5 80 -21 9\n'), expected: { kind: 'read', sweeps: [db([1e9], [-3.25]), db([1e9], [-3.5])], doubts: ['not-utf-8'] } },
];
