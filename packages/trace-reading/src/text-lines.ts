import { readingLimits } from './reading-limits.js';
import { refuse } from './reading-fault.js';

/** The lines of a text as places in it: nothing is copied until it is asked for. Numbered from 0 here, from 1 in all messages. */
export interface TextLines {
  readonly text: string;
  readonly count: number;
  readonly start: Uint32Array;
  readonly end: Uint32Array;
}

const lineFeed = 10;
const carriageReturn = 13;

/** Splits at LF, CR LF or CR, whichever each line has. */
export function splitLines(text: string): TextLines {
  let start = new Uint32Array(1024);
  let end = new Uint32Array(1024);
  let count = 0;
  const add = (from: number, to: number): void => {
    if (to - from > readingLimits.lineCharacters) throw refuse('line-too-long', `Line ${count + 1} has ${to - from} characters; the limit is ${readingLimits.lineCharacters}.`, count + 1);
    if (count === start.length) {
      start = grow(start);
      end = grow(end);
    }
    start[count] = from;
    end[count] = to;
    count += 1;
    if (count > readingLimits.rows + readingLimits.preambleLines + 1000) throw refuse('too-many-rows', `The file has more than ${readingLimits.rows} rows.`, count);
  };
  let from = 0;
  for (let at = 0; at < text.length; at += 1) {
    const sign = text.charCodeAt(at);
    if (sign !== lineFeed && sign !== carriageReturn) continue;
    add(from, at);
    if (sign === carriageReturn && text.charCodeAt(at + 1) === lineFeed) at += 1;
    from = at + 1;
  }
  if (from < text.length) add(from, text.length);
  return { text, count, start: start.subarray(0, count), end: end.subarray(0, count) };
}

function grow(places: Uint32Array): Uint32Array<ArrayBuffer> {
  const larger = new Uint32Array(places.length * 2);
  larger.set(places);
  return larger;
}

/** The text of a line. */
export function lineAt(lines: TextLines, line: number): string {
  return line >= 0 && line < lines.count ? lines.text.slice(lines.start[line], lines.end[line]) : '';
}
