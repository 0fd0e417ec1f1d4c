import { decide, doubt, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';
import { readingLimits } from './reading-limits.js';
import { scanEnd, scanNumber } from './scan-number.js';
import { sweepFromPoints } from './sweep-from-points.js';
import { lineAt, type TextLines } from './text-lines.js';
import type { ReadSweep } from './transcription.js';

/** A piece of a sweep: date, time, low, high, step, count, then a level a bin. */
interface Piece {
  readonly stamp: string;
  readonly line: number;
  readonly lowHz: number;
  readonly stepHz: number;
  readonly levels: readonly number[];
}

const stampPattern = /^\s*\d{4}-\d{2}-\d{2}\s*,\s*\d{1,2}:\d{2}(?::\d{2}(?:\.\d+)?)?\s*,/;

/** Whether the file is a wide sweep in rows of bins. */
export function isWideSweep(lines: TextLines): boolean {
  const firsts = Array.from({ length: Math.min(5, lines.count) }, (_, line) => lineAt(lines, line)).filter((text) => text.trim() !== '' && !text.startsWith('#'));
  return firsts.length > 0 && firsts.every((text) => stampPattern.test(text) && text.split(',').length >= 7);
}

function numberAt(cell: string, line: number, column: number): number {
  const text = cell.trim();
  const value = scanNumber(text, 0, text.length, 46);
  if (/^-?(?:nan|inf)$/i.test(text)) return NaN;
  if (Number.isNaN(value) || scanEnd.at !== text.length) throw refuse('bad-number', `Line ${line + 1}, column ${column + 1}: "${text.slice(0, 40)}" is no number.`, line + 1, column + 1);
  return value;
}

function readPiece(text: string, line: number): Piece {
  const cells = text.split(',');
  const [lowHz = NaN, highHz = NaN, statedStepHz = NaN] = cells.slice(2, 5).map((cell, at) => numberAt(cell, line, at + 2));
  const values = cells.slice(6).map((cell, at) => numberAt(cell, line, at + 6));
  const count = Math.max(1, Math.round((highHz - lowHz) / statedStepHz));
  const repeatsLast = values.length === count + 1 && values.at(-1) === values.at(-2);
  const levels = repeatsLast ? values.slice(0, -1) : values;
  if (levels.length !== count && Math.abs(levels.length - count) > 1) throw refuse('ragged-row', `Line ${line + 1} has ${levels.length} bins, expected ${count} from low, high and step.`, line + 1);
  return { stamp: `${cells[0]?.trim()}T${cells[1]?.trim()}`, line, lowHz, stepHz: (highHz - lowHz) / levels.length, levels };
}

/** Pieces of one sweep share a time stamp; where none repeats, a new sweep begins with the lowest piece. */
function sweepsOf(pieces: readonly Piece[]): Piece[][] {
  const lowest = Math.min(...pieces.map((piece) => piece.lowHz));
  const sweeps: Piece[][] = [];
  for (const piece of pieces) {
    const current = sweeps.at(-1);
    const isNew = current === undefined || current.some((other) => other.lowHz === piece.lowHz) || (piece.lowHz === lowest && current[0]?.stamp !== piece.stamp);
    if (isNew) sweeps.push([piece]);
    else current.push(piece);
  }
  return sweeps;
}

function pointsOf(pieces: readonly Piece[]) {
  const sorted = [...pieces].sort((one, other) => one.lowHz - other.lowHz);
  const frequency: number[] = [];
  const level: number[] = [];
  const lines: number[] = [];
  for (const piece of sorted) {
    piece.levels.forEach((value, bin) => {
      const centreHz = piece.lowHz + (bin + 0.5) * piece.stepHz;
      if (centreHz <= (frequency.at(-1) ?? -Infinity)) return;
      frequency.push(centreHz);
      level.push(value);
      lines.push(piece.line);
    });
  }
  return { frequencyHz: Float64Array.from(frequency), level: Float64Array.from(level), lines: Uint32Array.from(lines) };
}

/** Reads a wide sweep in rows of bins: pieces put in order, each level at the middle of its bin. Levels are relative: dB. */
export function readWideSweeps(notebook: Notebook, lines: TextLines): ReadSweep[] {
  const pieces: Piece[] = [];
  for (let line = 0; line < lines.count; line += 1) {
    const text = lineAt(lines, line);
    if (text.trim() === '' || text.startsWith('#')) continue;
    if (!stampPattern.test(text)) throw refuse('ragged-row', `Line ${line + 1} does not begin with date and time like the lines before it.`, line + 1);
    pieces.push(readPiece(text, line));
  }
  const sweeps = sweepsOf(pieces);
  const kept = sweeps.slice(0, readingLimits.sweeps);
  Object.assign(notebook.transcription, { delimiter: 'comma', decimalMark: '.', frequencyUnit: 'Hz', levelUnit: 'dB', firstDataLine: (pieces[0]?.line ?? 0) + 1 });
  notebook.transcription.rowsKept = kept.flat().length;
  notebook.transcription.rowsSkipped = pieces.length - kept.flat().length;
  decide(notebook, 'layout', 'rows of bins: date, time, low, high, step, count, levels');
  decide(notebook, 'levelUnit', 'rows of bins hold levels in dB against an unstated reference');
  doubt(notebook, { code: 'relative-levels', weight: 'doubt', message: 'The levels have no absolute unit: they pair only with levels of the same kind.' });
  if (sweeps.length > kept.length) doubt(notebook, { code: 'sweeps-left-out', weight: 'doubt', message: `The file holds ${sweeps.length} sweeps; the first ${kept.length} were read.` });
  return kept.map((sweep, at) => {
    const name = kept.length === 1 ? 'Sweep' : `Sweep ${at + 1}`;
    return { name, measuredAtText: sweep[0]?.stamp ?? '', sweep: sweepFromPoints(notebook, { name, points: pointsOf(sweep), unit: 'dB', impedanceOhm: 50, settings: {} }) };
  });
}
