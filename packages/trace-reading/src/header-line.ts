import type { DataBlock } from './data-blocks.js';
import { readCell } from './cell-value.js';
import { withoutCommentSign } from './preamble.js';
import { plainWords, preambleKeyOf } from './setting-words.js';
import { splitCells, type Separators } from './separators.js';
import { lineAt, type TextLines } from './text-lines.js';
import { frequencyUnitIn, frequencyUnitOf, levelUnitIn, levelUnitOf } from './unit-words.js';

/** Names of columns as a file gives them, and a line of units beneath where there is one. */
export interface Header {
  readonly line: number;
  readonly names: readonly string[];
  readonly units: readonly string[];
}

const frequencyWord = /^(?:f|x|freq\w*|frequenz\w*|frequence\w*|frequency\w*|stimulus|fr)\b|\bfreq|\bfrequenz|\bfrequence/;
const levelWord = /ampl|level|pegel|niveau|power|leistung|puissance|magnitude|^mag|trace|spur|betrag|spannung|tension|log mag|^s\d\d|^a$|^y$|signal|feld|field|champ|db|max|min|average|live|hold|messwert|valeur|wert|value|\bch\d|kanal|voie|^reading/;
const indexWord = /^(?:no|nr|n|index|idx|point|points|punkt|row|zeile|ligne|i|num|lfd nr|pos)$/;
const timeWord = /^(?:time|zeit|temps|t)\b/;
const phaseWord = /phase|deg|winkel|angle|\bphi\b/;
const limitWord = /limit|margin|abstand|marge|grenz|mask|limite|threshold/;

/** What a column's name says of it. */
export type NamedRole = 'frequency' | 'level' | 'index' | 'time' | 'phase' | 'limit' | null;

const isFrequencyName = (plain: string, name: string): boolean => frequencyWord.test(plain) || (frequencyUnitIn(name) !== null && levelUnitIn(name) === null);
const isLevelName = (plain: string, name: string): boolean => levelWord.test(plain) || levelUnitIn(name) !== null || levelUnitOf(name) !== null;

/** In the order in which they are tried: the first that fits is the role. */
const roleTests: readonly (readonly [Exclude<NamedRole, null>, (plain: string, name: string) => boolean])[] = [
  ['index', (plain, name) => name.trim() === '#' || indexWord.test(plain)], ['limit', (plain) => limitWord.test(plain)], ['frequency', isFrequencyName], ['time', (plain) => timeWord.test(plain)],
  ['phase', (plain, name) => phaseWord.test(plain) || name.includes('\u00b0')], ['level', isLevelName],
];

/** What a name says a column is. */
export function roleOfName(name: string): NamedRole {
  const plain = plainWords(name);
  return roleTests.find(([, fits]) => fits(plain, name))?.[0] ?? null;
}

function cellsOf(text: string, { delimiter }: Separators): string[] {
  const bare = withoutCommentSign(text).replace(/^(?:DATA|FORMAT|COLUMNS?)\s+(?=\S)/i, '');
  const cells = splitCells(delimiter === ' ' ? bare.replace(/\s+(?=[[(])/g, '') : bare, delimiter);
  if (cells.length > 1 || delimiter === ' ') return cells.map((cell) => cell.trim().replace(/^"(.*)"$/, '$1'));
  return (/\t/.test(bare) ? bare.split('\t') : bare.split(/\s*[,;]\s*|\s{2,}/)).map((cell) => cell.trim());
}

const isUnitCell = (cell: string): boolean => frequencyUnitOf(bareUnit(cell)) !== null || levelUnitOf(bareUnit(cell)) !== null;

/** Whether a line of two cells is a key with its value rather than two names; only "Time" and "Point" may also name a column. */
function isKeyWithValue(cells: readonly string[], roles: readonly NamedRole[]): boolean {
  const key = cells.length === 2 ? preambleKeyOf(cells[0] ?? '') : null;
  const mayNameColumn = (key === 'time' || key === 'points') && roles[1] === 'level';
  return key !== null && !mayNameColumn;
}

function namesColumns(roles: readonly NamedRole[], width: number): boolean {
  if (width === 1) return roles[0] === 'level';
  const has = (...wanted: readonly NamedRole[]): boolean => roles.some((role) => role !== null && wanted.includes(role));
  return has('frequency', 'index', 'time') || roles.filter((role) => role === 'level').length >= width - 1;
}

function isHeader(cells: readonly string[], width: number, { decimalMark }: Separators): boolean {
  if (cells.length < Math.max(Math.min(2, width), width - 1) || (cells.length > width + 1 && !cells.slice(0, width).some((cell) => roleOfName(cell) === 'frequency'))) return false;
  if (cells.some((cell) => ['number', 'no value'].includes(readCell(cell, decimalMark).kind) || /[:=]\s*\S/.test(cell))) return false;
  const roles = cells.map(roleOfName);
  return !isKeyWithValue(cells, roles) && namesColumns(roles, width);
}

const bareUnit = (cell: string): string => cell.replace(/^[[(](.*)[\])]$/, '$1');

/** Whether a line holds nothing but units. */
function isUnitLine(cells: readonly string[], width: number): boolean {
  return cells.length >= Math.max(1, width - 1) && cells.length <= width && cells.some(isUnitCell) && cells.every((cell) => cell === '' || isUnitCell(cell) || /^(?:-|#|1|deg|\u00b0|rad|s)$/.test(cell));
}

const linesAbove = 8;

/** The line above a block that names its columns, with the line of units between them; null where there is none. */
export function findHeader(lines: TextLines, block: DataBlock, separators: Separators): Header | null {
  const width = block.columns.length;
  let units: string[] = [];
  let seen = 0;
  for (let line = block.firstLine - 1; line >= 0 && seen < linesAbove; line -= 1) {
    const text = lineAt(lines, line);
    if (text.trim() === '') continue;
    seen += 1;
    const cells = cellsOf(text, separators);
    if (units.length === 0 && isUnitLine(cells, width)) {
      units = cells.map(bareUnit);
      continue;
    }
    if (isHeader(cells, width, separators)) return { line, names: cells, units };
  }
  return units.length > 0 ? { line: block.firstLine - 1, names: units.map(() => ''), units } : null;
}
