import { valueAt } from '@leeside/units/value-at';
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

const defaults: Options = { unit: 'GHz', parameter: 's', format: 'ma', impedanceOhm: 50 };

/** What one word of the option line says; null where it says nothing that is known. */
function optionOf(word: string): Partial<Options> | null {
  const unit = frequencyUnitOf(word);
  if (unit !== null) return { unit };
  if (/^[syzgh]$/.test(word)) return { parameter: word };
  return word === 'db' || word === 'ma' || word === 'ri' ? { format: word } : null;
}

function optionsOf(text: string): Options | null {
  if (!/^\s*#/.test(text)) return null;
  const bare = text.replace(/^\s*#/, '').replace(/!.*$/, '').trim().toLowerCase();
  const impedance = /(?:^|\s)r\s+(\d+(?:\.\d*)?)/.exec(bare);
  const words = bare.replace(/(?:^|\s)r\s+\d+(?:\.\d*)?/, ' ').split(/\s+/).filter((word) => word !== '');
  const found = words.map(optionOf);
  if (found.includes(null)) return null;
  const options = found.reduce<Options>((known, option) => ({ ...known, ...option }), defaults);
  return impedance === null ? options : { ...options, impedanceOhm: Number(impedance[1]) };
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
  const body = { options: null as Options | null, keywords: new Map<string, string>(), rows: [] as { line: number; values: number[] }[] };
  for (let line = 0; line < lines.count; line += 1) {
    const text = lineAt(lines, line).replace(/!.*$/, '').trim();
    const key = keyword.exec(text);
    if (key === null) readBodyLine(body, text, line);
    else {
      const [, name = '', value = ''] = key;
      if (/^(?:end|noise data)$/i.test(name.trim())) break;
      body.keywords.set(name.trim().toLowerCase(), value.trim());
    }
  }
  return { ...body, options: body.options ?? defaults };
}

function readBodyLine(body: { options: Options | null; keywords: ReadonlyMap<string, string>; rows: { line: number; values: number[] }[] }, text: string, line: number): void {
  if (text.startsWith('#')) body.options ??= optionsOf(text);
  else if (text !== '' && !isReferenceList(body.keywords, body.rows)) body.rows.push({ line, values: numbersOf(text, line) });
}

/** Impedances of version 2 may stand on lines of their own before the network data. */
function isReferenceList(keywords: ReadonlyMap<string, string>, rows: readonly unknown[]): boolean {
  return keywords.has('version') && !keywords.has('network data') && rows.length === 0;
}

function portCount({ keywords, rows }: Body, fileName: string): number {
  const stated = Number.parseInt(keywords.get('number of ports') ?? /\.s(\d+)p$/i.exec(fileName)?.[1] ?? '', 10);
  if (stated > 0) return stated;
  const [width = 0, next = 0] = rows.slice(0, 2).map(({ values }) => values.length);
  const byWidth = new Map([[3, 1], [7, 3], [9, next === 8 ? 4 : 2]]).get(width);
  if (byWidth === undefined) throw refuse('needs-mapping', 'How many ports the file has is told neither by its ending nor by its rows.', valueAt(rows.map(({ line }) => line), 0) + 1);
  return byWidth;
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
    const { point, next } = pointAt(rows, at, pairCount);
    const before = points.at(-1);
    if (before !== undefined && point.frequency <= before.frequency) return { points, noiseRows: rows.length - at };
    if (point.pairs.length !== 2 * pairCount) throw refuse('ragged-row', `Line ${point.line + 1}: ${point.pairs.length} values follow the frequency, expected ${2 * pairCount}.`, point.line + 1);
    points.push(point);
    at = next;
  }
  return { points, noiseRows: 0 };
}

function pointAt(rows: Body['rows'], at: number, pairCount: number): { point: Point; next: number } {
  const taken: number[] = [];
  let next = at;
  for (; taken.length < 1 + 2 * pairCount && next < rows.length; next += 1) taken.push(...(rows[next]?.values ?? []));
  const [frequency = NaN, ...pairs] = taken;
  return { point: { frequency, line: rows[at]?.line ?? 0, pairs }, next };
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
  if (noiseRows > 0) doubt(notebook, { code: 'noise-section', weight: 'note', message: `${noiseRows} rows of noise data after the network data were passed over.` });
  if (ports === 1) doubt(notebook, { code: 'reflection-only', weight: 'doubt', message: 'The file holds a reflection; it tells nothing of attenuation.' });
}
