import { decibelsFromPowerRatio } from '@leeside/units/decibels';
import type { Fixture } from './fixture.js';
import { joined, latin1, utf8 } from './encode-text.js';

const refused = (file: string, code: string, bytes: () => Uint8Array, line?: number): Fixture => ({ file, bytes, expected: { kind: 'refused', code, ...(line === undefined ? {} : { line }) } });
const good = 'Frequency [Hz],Level [dBm]\n1000,-50\n2000,-51\n3000,-52.5\n';
const mebibyte = 1024 * 1024;

/** Files whose bytes are no trace, whatever their names say. */
export const brokenBytes: readonly Fixture[] = [
  refused('picture.csv', 'not-text', () => joined([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0, 0, 13])),
  refused('photograph.csv', 'not-text', () => joined([0xff, 0xd8, 0xff, 0xe0, 0, 16])),
  refused('document.csv', 'not-text', () => joined('%PDF-1.7\n1 0 obj\n')),
  refused('program.csv', 'not-text', () => joined([0x7f, 0x45, 0x4c, 0x46, 2, 1, 1, 0])),
  refused('workbook.csv', 'not-text', () => joined([0x50, 0x4b, 3, 4], '....[Content_Types].xml....xl/workbook.xml')),
  refused('old-workbook.csv', 'not-text', () => joined([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1])),
  refused('archive-of-traces.csv', 'archive-not-supported', () => joined([0x50, 0x4b, 3, 4], '....trace-1.csv....')),
  refused('packed-trace.csv', 'archive-not-supported', () => joined([0x1f, 0x8b, 8, 0, 0, 0])),
  refused('nothing.csv', 'empty-file', () => joined('')),
  refused('mark-alone.csv', 'empty-file', () => joined([0xef, 0xbb, 0xbf])),
  refused('blanks-alone.csv', 'empty-file', () => joined('   \n\t\n  \n')),
  refused('comments-alone.csv', 'empty-file', () => joined('# Date: 2026-02-03\n# nothing came\n')),
  refused('utf-32.csv', 'unsupported-encoding', () => joined([0xff, 0xfe, 0, 0], [...good].flatMap((sign) => [sign.charCodeAt(0), 0, 0, 0]))),
  refused('utf-32-other-order.csv', 'unsupported-encoding', () => joined([0, 0, 0xfe, 0xff], [...good].flatMap((sign) => [0, 0, 0, sign.charCodeAt(0)]))),
  refused('broken-character.csv', 'bad-encoding', () => joined('Frequency [Hz],Level [dB\u00b5V]\n1000,50\n2000,5', [0x81], '1\n3000,52\n'), 3),
  refused('mixed-encodings.csv', 'bad-encoding', () => joined('Fr\u00e9quence [Hz],Niveau [dBm]\n1000,-50\n# mesur', [0xe9], ' ici\n2000,-51\n'), 3),
  refused('binary-numbers.csv', 'not-text', () => Uint8Array.from({ length: 4096 }, (_, at) => (at * 193 + (at >> 3)) & 255)),
  refused('zero-bytes-and-no-text.csv', 'not-text', () => Uint8Array.from({ length: 512 }, (_, at) => (at % 7 === 0 ? 3 : 0))),
  refused('full-width-digits.csv', 'bad-number', () => utf8(good.replace('2000,-51', '\uff12\uff10\uff10\uff10,-51')), 3),
  refused('arabic-digits.csv', 'bad-number', () => utf8(good.replace('2000,-51', '2000,-\u0665\u0661')), 3),
  { file: 'japanese-names.csv', bytes: () => joined([0x8e, 0xfc, 0x94, 0x67, 0x90, 0x94], ' [Hz],', [0x83, 0x8c, 0x83, 0x78, 0x83, 0x8b], ' [dBm]\n1000,-50\n2000,-51\n'), expected: { kind: 'question', code: 'encoding' } },
  { file: 'western-signs.csv', bytes: () => latin1('# 23 \u00b0C, pr\u00fcfung\nFrequency [Hz],Level [dB\u00b5V]\n1000,57\n2000,56\n'), expected: { kind: 'read', sweeps: [{ unit: 'dBm', frequencyHz: [1000, 2000], level: [57, 56].map((dbuv) => dbuv - 120 + decibelsFromPowerRatio(20)) }], doubts: ['not-utf-8', 'converted-at-impedance'] } },
  { file: 'harmless-test-string.csv', bytes: () => joined('# X5O!P%@AP[4]\n', good), expected: { kind: 'read', sweeps: [{ unit: 'dBm', frequencyHz: [1000, 2000, 3000], level: [-50, -51, -52.5] }] } },
  { ...refused('one-endless-line.csv', 'line-too-long', () => new Uint8Array(20 * mebibyte).fill(0x31), 1), isBig: true },
  { ...refused('too-large.csv', 'too-large', () => new Uint8Array(64 * mebibyte + 1).fill(0x0a)), isBig: true },
  { ...refused('too-many-rows.csv', 'too-many-rows', () => utf8(`Frequency [Hz],Level [dBm]\n${Array.from({ length: 2_000_001 }, (_, at) => `${at + 1},-50.5\n`).join('')}`), 2_000_002), isBig: true },
];
