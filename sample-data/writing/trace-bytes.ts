import type { AnalyzerTrace } from './analyzer-trace.js';
import { decimalCommaText } from './decimal-comma-text.js';
import { keyColonText } from './key-colon-text.js';
import { levelsOnlyText } from './levels-only-text.js';
import { plainText } from './plain-text.js';
import { preambleText } from './preamble-text.js';
import { tabKilohertzText } from './tab-kilohertz-text.js';

const utf8 = (text: string): Uint8Array => new TextEncoder().encode(text);
const utf16WithMark = (text: string): Uint8Array => new Uint8Array(Buffer.from(`\uFEFF${text}`, 'utf16le'));

const writers = {
  plain: (trace: AnalyzerTrace) => utf8(plainText(trace)),
  preamble: (trace: AnalyzerTrace) => utf8(preambleText(trace)),
  'decimal comma': (trace: AnalyzerTrace) => utf8(decimalCommaText(trace)),
  'tab kHz dBµV': (trace: AnalyzerTrace) => utf8(tabKilohertzText(trace)),
  'levels only': (trace: AnalyzerTrace) => utf8(levelsOnlyText(trace)),
  'UTF-16': (trace: AnalyzerTrace) => utf16WithMark(preambleText(trace)),
  'key: value': (trace: AnalyzerTrace) => utf8(keyColonText(trace)),
} as const;

/** The layouts in which an invented analyzer can save a trace. */
export type FileLayout = keyof typeof writers;

/** All layouts by name. */
export const fileLayouts = Object.keys(writers) as FileLayout[];

/** The bytes of a trace file in a layout; the same trace gives the same bytes. */
export function traceBytes(trace: AnalyzerTrace, layout: FileLayout): Uint8Array {
  return writers[layout](trace);
}
