import { decibelsFromFieldRatio } from '@leeside/units/decibels';
import { frequencyHzFrom, type FrequencyUnit } from '@leeside/units/frequency-unit';
import { decide, doubt, takeSettings, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';
import { scanEnd, scanNumber } from './scan-number.js';
import { sweepFromPoints } from './sweep-from-points.js';
import { lineAt, type TextLines } from './text-lines.js';
import type { ReadSweep } from './transcription.js';
import { frequencyUnitOf } from './unit-words.js';

type Format = 'db' | 'ma' | 'ri';

/** The option line: unit, parameter, format and impedance, in any order and case; what is missing has its default. */
interface Options {
  readonly unit: FrequencyUnit;
  readonly parameter: string;
  readonly format: Format;
  readonly impedanceOhm: number;
}

const keyword = /^\s*\[([^\]]+)\]\s*(.*)$/;

function optionsOf(text: string): Options | null {
  if (!/^\s*#/.test(text)) return null;
  const words = text.replace(/^\s*#/, '').replace(/!.*$/, '').trim().toLowerCase().split(/\s+/).filter((word) => word !== '');
  let options: Options = { unit: 'GHz', parameter: 's', format: 'ma', impedanceOhm: 50 };
  for (let at = 0; at < words.length; at += 1) {
    const word = words[at] ?? '';
    const unit = frequencyUnitOf(word);
    if (unit !== null) options = { ...options, unit };
    else if (/^[syzgh]$/.test(word)) options = { ...options, parameter: word };
    else if (word === 'db' || word === 'ma' || word === 'ri') options = { ...options, format: word };
    else if (word === 'r' && Number.isFinite(Number.parseFloat(words[at + 1] ?? ''))) {
      options = { ...options, impedanceOhm: Number.parseFloat(words[at + 1] ?? '') };
      at += 1;
    } else return null;
  }
  return options;
}

const headLines = 300;

/** Whether a file is Touchstone: by its option line, or by the keyword of version 2. */
export function isTouchstone(lines: TextLines, fileName: string): boolean {
  const hasEnding = /\.(?:s\d+p|ts)$/i.test(fileName);
  for (let line = 0; line < Math.min(lines.count, headLines); line += 1) {
    const text = lineAt(lines, line);
    if (/^\s*\[version\]\s*2/i.test(text)) return true;
    if (optionsOf(text) !== null) return hasEnding || text.trim().replace(/^#/, '').trim() !== '';
  }
  return hasEnding;
}

interface Body {
  readonly options: Options;
  readonly keywords: ReadonlyMap<string, string>;
  /** Numbers of each line of data with the line's number. */
  readonly rows: readonly { readonly line: number; readonly values: readonly number[] }[];
}

function numbersOf(text: string, line: number): number[] {
  const words = text.trim().split(/\s+/);
  return words.map((word, column) => {
    const value = scanNumber(word, 0, word.length, 46);
    if (!Number.isFinite(value) || scanEnd.at !== word.length) throw refuse('bad-number', `Line ${line + 1}, column ${column + 1}: "${word.slice(0, 40)}" is no number.`, line + 1, column + 1);
    return value;
  });
}

function readBody(lines: TextLines): Body {
  let options: Options | null = null;
  const keywords = new Map<string, string>();
  const rows: { line: number; values: number[] }[] = [];
  for (let line = 0; line < lines.count; line += 1) {
    const text = lineAt(lines, line).replace(/!.*$/, '').trim();
    const key = keyword.exec(text);
    if (key) {
      const name = (key[1] ?? '').trim().toLowerCase();
      if (name === 'end' || name === 'noise data') break;
      keywords.set(name, (key[2] ?? '').trim());
    } else if (text.startsWith('#')) options ??= optionsOf(text);
    else if (text !== '' && !isReferenceList(keywords, rows)) rows.push({ line, values: numbersOf(text, line) });
  }
  return { options: options ?? { unit: 'GHz', parameter: 's', format: 'ma', impedanceOhm: 50 }, keywords, rows };
}

/** Impedances of version 2 may stand on lines of their own before the network data. */
function isReferenceList(keywords: ReadonlyMap<string, string>, rows: readonly unknown[]): boolean {
  return keywords.has('version') && !keywords.has('network data') && rows.length === 0;
}

function portCount({ keywords, rows }: Body, fileName: string): number {
  const stated = Number.parseInt(keywords.get('number of ports') ?? '', 10);
  if (stated > 0) return stated;
  const byName = Number(/\.s(\d+)p$/i.exec(fileName)?.[1] ?? 0);
  if (byName > 0) return byName;
  const width = rows[0]?.values.length ?? 0;
  if (width === 3) return 1;
  if (width === 9) return rows[1] !== undefined && rows[1].values.length === 8 ? 4 : 2;
  if (width === 7) return 3;
  throw refuse('needs-mapping', 'How many ports the file has is told neither by its ending nor by its rows.', (rows[0]?.line ?? 0) + 1);
}

interface Point {
  readonly frequency: number;
  readonly line: number;
  readonly pairs: readonly number[];
}

/** Rows as points: a frequency with all pairs of the matrix, over as many lines as it takes. A falling frequency begins noise data. */
function pointsOf({ rows }: Body, pairCount: number): { points: Point[]; noiseRows: number } {
  const points: Point[] = [];
  for (let at = 0; at < rows.length;) {
    const first = rows[at];
    const [frequency = NaN, ...pairs] = first?.values ?? [];
    if (points.length > 0 && frequency <= (points.at(-1)?.frequency ?? 0)) return { points, noiseRows: rows.length - at };
    let next = at + 1;
    for (; pairs.length < 2 * pairCount && next < rows.length; next += 1) pairs.push(...(rows[next]?.values ?? []));
    if (pairs.length !== 2 * pairCount) throw refuse('ragged-row', `Line ${(first?.line ?? 0) + 1}: ${pairs.length} values follow the frequency, expected ${2 * pairCount}.`, (first?.line ?? 0) + 1);
    points.push({ frequency, line: first?.line ?? 0, pairs });
    at = next;
  }
  return { points, noiseRows: 0 };
}

function levelDb(format: Format, one: number, other: number): number {
  if (format === 'db') return one;
  return decibelsFromFieldRatio(format === 'ma' ? Math.abs(one) : Math.hypot(one, other));
}

/** Which pair of a point is the parameter from port b to port a. Two ports stand column by column unless version 2 says otherwise. */
function pairIndex(ports: number, to: number, from: number, keywords: ReadonlyMap<string, string>): number {
  const isByRow = ports !== 2 || keywords.get('two-port data order')?.replaceAll(' ', '') === '12_21';
  return isByRow ? (to - 1) * ports + (from - 1) : (from - 1) * ports + (to - 1);
}

function transmissions(ports: number): { to: number; from: number }[] {
  if (ports === 1) return [{ to: 1, from: 1 }];
  const all = Array.from({ length: ports * ports }, (_, at) => ({ to: Math.floor(at / ports) + 1, from: (at % ports) + 1 })).filter(({ to, from }) => to !== from);
  return all.sort((one, other) => Number(other.to > other.from) - Number(one.to > one.from));
}

/**
 * Reads a Touchstone file: its transmission parameters as sweeps in dB, S21 first; the reflection where there is but one port.
 * @source Touchstone File Format Specification (IBIS Open Forum), versions 1.1 and 2.0.
 */
export function readTouchstone(notebook: Notebook, lines: TextLines, fileName: string): ReadSweep[] {
  const body = readBody(lines);
  const { options, keywords } = body;
  if (body.rows.length === 0) throw refuse('no-data', 'The file holds no row of numbers.');
  if (options.parameter !== 's') throw refuse('needs-mapping', `The file holds ${options.parameter.toUpperCase()} parameters; only S parameters are transmission.`);
  const ports = portCount(body, fileName);
  const matrix = keywords.get('matrix format')?.toLowerCase() ?? 'full';
  if (matrix !== 'full') throw refuse('needs-mapping', `The matrix format "${matrix}" is not read; save the full matrix.`);
  const { points, noiseRows } = pointsOf(body, ports * ports);
  describe(notebook, body, { ports, points, noiseRows });
  const frequencyHz = Float64Array.from(points, (point) => frequencyHzFrom(point.frequency, options.unit));
  const lineOf = Uint32Array.from(points, (point) => point.line);
  return transmissions(ports).map(({ to, from }) => {
    const at = 2 * pairIndex(ports, to, from, keywords);
    const level = Float64Array.from(points, ({ pairs }) => levelDb(options.format, pairs[at] ?? NaN, pairs[at + 1] ?? NaN));
    const name = `S${to}${from}`;
    return { name, sweep: sweepFromPoints(notebook, { name, points: { frequencyHz, level, lines: lineOf }, unit: 'dB', impedanceOhm: options.impedanceOhm, settings: { impedanceOhm: options.impedanceOhm } }) };
  });
}

function describe(notebook: Notebook, { options, keywords }: Body, { ports, points, noiseRows }: { ports: number; points: readonly Point[]; noiseRows: number }): void {
  const { transcription } = notebook;
  Object.assign(transcription, { delimiter: 'blanks', decimalMark: '.', frequencyUnit: options.unit, levelUnit: 'dB', firstDataLine: (points[0]?.line ?? 0) + 1, rowsKept: points.length, rowsSkipped: noiseRows });
  takeSettings(notebook, { impedanceOhm: options.impedanceOhm });
  decide(notebook, 'layout', `Touchstone ${keywords.get('version') ?? '1.1'}, ${ports} port${ports === 1 ? '' : 's'}, ${options.format.toUpperCase()} pairs, by its option line`);
  decide(notebook, 'frequencyUnit', 'option line');
  decide(notebook, 'levelUnit', 'magnitude of the S parameter in dB');
  if (noiseRows > 0) doubt(notebook, 'noise-section', 'note', `${noiseRows} rows of noise data after the network data were passed over.`);
  if (ports === 1) doubt(notebook, 'reflection-only', 'doubt', 'The file holds a reflection; it tells nothing of attenuation.');
}
