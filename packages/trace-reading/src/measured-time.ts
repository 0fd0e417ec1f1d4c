import { entryOf, type Preamble } from './preamble.js';

const months = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const otherMonths: Readonly<Record<string, number>> = { mai: 5, juin: 6, juil: 7, aou: 8, mrz: 3, 'm\u00e4r': 3, okt: 10, dez: 12, fev: 2, avr: 4, janv: 1 };

const pad = (value: number): string => String(value).padStart(2, '0');

function monthOf(word: string): number | null {
  const plain = word.toLowerCase();
  const at = months.indexOf(plain.slice(0, 3));
  if (at >= 0) return at + 1;
  return otherMonths[plain.slice(0, 4)] ?? otherMonths[plain.slice(0, 3)] ?? null;
}

/** Year, month and day of a text, where they are told without doubt; a date of two-digit parts that may be read two ways is none. */
function dateIn(text: string): string | null {
  const iso = /\b(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})\b/.exec(text);
  if (iso) return `${iso[1]}-${pad(Number(iso[2]))}-${pad(Number(iso[3]))}`;
  const named = /\b(\d{1,2})[.\s-]*(\p{L}{3,9})\.?[\s,-]*(\d{4})\b/u.exec(text);
  const month = named === null ? null : monthOf(named[2] ?? '');
  if (named && month !== null) return `${named[3]}-${pad(month)}-${pad(Number(named[1]))}`;
  const dotted = /\b(\d{1,2})\.(\d{1,2})\.(\d{4})\b/.exec(text);
  return dotted ? `${dotted[3]}-${pad(Number(dotted[2]))}-${pad(Number(dotted[1]))}` : null;
}

function clockIn(text: string): string | null {
  const clock = /\b(\d{1,2}):(\d{2})(?::(\d{2})(?:\.\d+)?)?\s*([ap]m)?/i.exec(text);
  if (!clock) return null;
  const half = (clock[4] ?? '').toLowerCase();
  const hour = (Number(clock[1]) % (half === '' ? 24 : 12)) + (half === 'pm' ? 12 : 0);
  return `${pad(hour)}:${clock[2]}:${clock[3] ?? '00'}`;
}

/** When a sweep was measured: the words of the file, and ISO 8601 where date, clock and zone are told without doubt. */
export function measuredTime(preamble: Preamble): { text?: string; iso?: string } {
  const date = entryOf(preamble, 'date')?.value.replaceAll('|', ' ');
  const time = entryOf(preamble, 'time')?.value.replaceAll('|', ' ');
  const text = [date, time].filter((part) => part !== undefined).join(' ').trim().slice(0, 100);
  if (text === '') return {};
  const [day, clock] = [dateIn(text), clockIn(text)];
  const zone = /(?:\d|\s)(Z|[+-]\d{2}:\d{2})\b/.exec(text)?.[1];
  const iso = day === null || clock === null || zone === undefined ? null : `${day}T${clock}${zone}`;
  return { text, ...(iso === null || Number.isNaN(Date.parse(iso)) ? {} : { iso }) };
}
