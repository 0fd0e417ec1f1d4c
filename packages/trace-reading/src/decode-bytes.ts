import { ask, decide, doubt, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';

const signatures: readonly (readonly [readonly number[], string, string])[] = [
  [[0x89, 0x50, 0x4e, 0x47], 'not-text', 'This looks like a picture. Export the trace as text.'],
  [[0xff, 0xd8, 0xff], 'not-text', 'This looks like a picture. Export the trace as text.'],
  [[0x25, 0x50, 0x44, 0x46], 'not-text', 'This looks like a PDF document. Export the trace as text.'],
  [[0x7f, 0x45, 0x4c, 0x46], 'not-text', 'This is a program, not a trace.'],
  [[0xd0, 0xcf, 0x11, 0xe0], 'not-text', 'This looks like a spreadsheet workbook. Export it as CSV.'],
  [[0x1f, 0x8b], 'archive-not-supported', 'This is a compressed file. Unpack it and send what is inside.'],
];
const zipSignature = [0x50, 0x4b, 0x03, 0x04];
const startsWith = (bytes: Uint8Array, signature: readonly number[]): boolean => signature.every((byte, at) => bytes[at] === byte);

function refuseOtherFormats(bytes: Uint8Array): void {
  for (const [signature, code, message] of signatures) if (startsWith(bytes, signature)) throw refuse(code, message);
  if (!startsWith(bytes, zipSignature)) return;
  const head = new TextDecoder('latin1').decode(bytes.subarray(0, 4096));
  if (/xl\/|\[Content_Types\]/.test(head)) throw refuse('not-text', 'This looks like a spreadsheet workbook. Export it as CSV.');
  throw refuse('archive-not-supported', 'This is an archive. Unpack it and send what is inside.');
}

/** Share of NULs at even and odd places of the head. */
function nulShares(bytes: Uint8Array): { even: number; odd: number } {
  const count = Math.min(bytes.length, 8192) & ~1;
  let even = 0;
  let odd = 0;
  for (let at = 0; at < count; at += 2) {
    if (bytes[at] === 0) even += 1;
    if (bytes[at + 1] === 0) odd += 1;
  }
  return { even: even / (count / 2), odd: odd / (count / 2) };
}

function decodeStrictly(bytes: Uint8Array, label: string): string | null {
  try {
    return new TextDecoder(label, { fatal: true, ignoreBOM: false }).decode(bytes);
  } catch {
    return null;
  }
}

function utf16(notebook: Notebook, bytes: Uint8Array, label: 'utf-16le' | 'utf-16be', how: string): string {
  const text = decodeStrictly(bytes.length % 2 === 0 ? bytes : bytes.subarray(0, -1), label);
  if (text === null) throw refuse('bad-encoding', 'The file looks like UTF-16 but holds broken characters.');
  notebook.transcription.encoding = label;
  decide(notebook, 'encoding', how);
  return text;
}

function byMark(notebook: Notebook, bytes: Uint8Array): string | null {
  if (startsWith(bytes, [0xff, 0xfe, 0, 0]) || startsWith(bytes, [0, 0, 0xfe, 0xff])) throw refuse('unsupported-encoding', 'The file is UTF-32. Save it as UTF-8.');
  if (startsWith(bytes, [0xff, 0xfe])) return utf16(notebook, bytes, 'utf-16le', 'byte order mark');
  if (startsWith(bytes, [0xfe, 0xff])) return utf16(notebook, bytes, 'utf-16be', 'byte order mark');
  return null;
}

const mostPadding = 0.35;

function byNulPattern(notebook: Notebook, bytes: Uint8Array): string | null {
  if (!bytes.includes(0)) return null;
  const { even, odd } = nulShares(bytes);
  if (Math.max(even, odd) > 0.7 && Math.min(even, odd) < 0.1) {
    doubt(notebook, { code: 'utf-16-without-mark', weight: 'note', message: 'The file looks like UTF-16 without its mark and was read as such.' });
    return utf16(notebook, bytes, odd > even ? 'utf-16le' : 'utf-16be', 'zero bytes at every other place');
  }
  const kept = bytes.filter((byte) => byte !== 0);
  const hasOthers = kept.some((byte) => byte < 32 && byte !== 9 && byte !== 10 && byte !== 13 && byte !== 26);
  if (hasOthers || kept.length < (1 - mostPadding) * bytes.length) throw refuse('not-text', 'The file holds bytes that are no text.');
  doubt(notebook, { code: 'padding-removed', weight: 'note', message: `${bytes.length - kept.length} zero bytes between readable text were passed over.` });
  return decodePlain(notebook, kept);
}

/** Windows-1252 signs that stand in units and names: µ, °, ², ·, –, letters of Western languages. */
const isWestern = (byte: number): boolean => byte >= 0xa0 || [0x80, 0x85, 0x91, 0x92, 0x93, 0x94, 0x96, 0x97, 0x99].includes(byte);

/** Bytes that a UTF-8 character with this first byte has; 0 where none begins so. */
function characterLength(lead: number): number {
  if (lead < 0x80) return 1;
  if (lead >= 0xc2 && lead < 0xe0) return 2;
  if (lead >= 0xe0 && lead < 0xf0) return 3;
  return lead >= 0xf0 && lead < 0xf5 ? 4 : 0;
}

function firstBadByte(bytes: Uint8Array): number {
  for (let at = 0; at < bytes.length;) {
    const length = characterLength(bytes[at] ?? 0);
    if (length === 0 || (length > 1 && decodeStrictly(bytes.subarray(at, at + length), 'utf-8') === null)) return at;
    at += length;
  }
  return -1;
}

function lineOfByte(bytes: Uint8Array, place: number): number {
  let line = 1;
  for (let at = 0; at < place; at += 1) if (bytes[at] === 10) line += 1;
  return line;
}

function holdsGoodUtf8(bytes: Uint8Array): boolean {
  for (let at = 0; at + 1 < bytes.length; at += 1) {
    if ((bytes[at] ?? 0) >= 0xc2 && (bytes[at] ?? 0) < 0xf5 && ((bytes[at + 1] ?? 0) & 0xc0) === 0x80) return true;
  }
  return false;
}

function holdsPairs(bytes: Uint8Array): boolean {
  let pairs = 0;
  let singles = 0;
  for (let at = 0; at < bytes.length; at += 1) {
    if ((bytes[at] ?? 0) < 0x80) continue;
    let run = 1;
    while ((bytes[at + run] ?? 0) >= 0x80) run += 1;
    if (run > 1) pairs += 1;
    else singles += 1;
    at += run;
  }
  return pairs > singles;
}

function byQuestion(notebook: Notebook, bytes: Uint8Array, line: number): string {
  const sampleOf = (label: string): string => new TextDecoder(label).decode(bytes.subarray(0, 4096)).split(/\r?\n/).filter((text) => /[^\x20-\x7e\t]/.test(text)).slice(0, 3).join('\n');
  const labels = ['shift_jis', 'gb18030', 'windows-1252'] as const;
  const label = ask(notebook, { id: 'encoding', code: 'encoding', message: 'The file is not Unicode, and several encodings are possible.', lines: [line], choices: labels.map((id) => ({ id, label: id, sample: sampleOf(id) })) });
  notebook.transcription.encoding = label;
  return new TextDecoder(label).decode(bytes);
}

function decodePlain(notebook: Notebook, bytes: Uint8Array): string {
  const text = decodeStrictly(bytes, 'utf-8');
  if (text !== null) {
    notebook.transcription.encoding = 'utf-8';
    decide(notebook, 'encoding', startsWith(bytes, [0xef, 0xbb, 0xbf]) ? 'byte order mark' : 'every byte fits UTF-8');
    return text;
  }
  const bad = firstBadByte(bytes);
  const line = lineOfByte(bytes, bad);
  if (holdsPairs(bytes)) {
    if (holdsGoodUtf8(bytes) && !bytes.some((byte, at) => byte >= 0x80 && at > bad && byte < 0xa0 && !isWestern(byte))) throw refuse('bad-encoding', `The encoding changes within the file: byte ${bad} (line ${line}) is no UTF-8.`, line);
    return byQuestion(notebook, bytes, line);
  }
  if (holdsGoodUtf8(bytes) || bytes.some((byte) => byte >= 0x80 && !isWestern(byte))) throw refuse('bad-encoding', `Byte ${bad} (line ${line}) is no UTF-8.`, line);
  notebook.transcription.encoding = 'windows-1252';
  decide(notebook, 'encoding', 'not UTF-8; every byte fits Windows-1252');
  doubt(notebook, { code: 'not-utf-8', weight: 'note', message: `The file is not UTF-8; it was read as Windows-1252 (line ${line}).`, line: line });
  return new TextDecoder('windows-1252').decode(bytes);
}

/** The length of an IEEE 488.2 definite-length block prefix (`#` n, n digits), where the digits name the bytes that follow. */
function blockPrefixLength(bytes: Uint8Array): number {
  const head = new TextDecoder('latin1').decode(bytes.subarray(0, 12));
  const parts = /^#([1-9])(\d+)/.exec(head);
  const digits = Number(parts?.[1] ?? 0);
  const count = parts?.[2]?.slice(0, digits) ?? '';
  if (digits === 0 || count.length !== digits) return 0;
  const rest = bytes.length - 2 - digits - Number(count);
  return rest >= 0 && rest <= 2 ? 2 + digits : 0;
}

/**
 * Bytes as text: by mark, by the pattern of zero bytes, as strict UTF-8, else as Windows-1252 with a doubt. Never guessed in silence.
 * @param notebook where encoding and doubts are written.
 * @param bytes the file.
 * @returns its text without mark, block prefix or end-of-file sign.
 */
export function decodeBytes(notebook: Notebook, bytes: Uint8Array): string {
  refuseOtherFormats(bytes);
  const prefix = blockPrefixLength(bytes);
  const body = bytes.subarray(prefix);
  const text = byMark(notebook, body) ?? byNulPattern(notebook, body) ?? decodePlain(notebook, body);
  return text.replace(/\u001a\s*$/, '');
}
