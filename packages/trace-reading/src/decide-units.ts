import { valueAt } from '@leeside/units/value-at';
import { hertzPerUnit, type FrequencyUnit } from '@leeside/units/frequency-unit';
import { formatFrequency } from '@leeside/units/format-quantity';
import { ask, decide, doubt, type Notebook } from './notebook.js';
import { entryOf, type Preamble } from './preamble.js';
import { levelValue } from './quantity.js';
import type { StatedRange } from './stated-range.js';
import { frequencyUnitIn, frequencyUnitOf, levelUnitIn, type DeclaredLevelUnit } from './unit-words.js';

/** Where a unit was found, and what it is. */
interface Found<Unit> {
  readonly unit: Unit;
  readonly how: string;
}

export interface RowsShown {
  readonly lines: readonly number[];
  readonly frequency: readonly number[];
  readonly level: readonly number[];
}

function askConflict<Unit extends string>(notebook: Notebook, { id, lines, show }: { id: string; lines: readonly number[]; show: (unit: Unit) => string }, found: readonly Found<Unit>[]): Found<Unit> {
  const distinct = found.filter((one, at) => found.findIndex((other) => other.unit === one.unit) === at);
  if (distinct.length === 1 && distinct[0]) return distinct[0];
  const unit = ask(notebook, {
    id, code: 'unit-conflict', message: `The file names two units: ${distinct.map((one) => `${one.unit} (${one.how})`).join(' and ')}.`, lines,
    choices: distinct.map((one) => ({ id: one.unit, label: one.unit, sample: show(one.unit) })),
  });
  return { unit, how: 'a person\u2019s answer' };
}

const rangeTolerance = 0.02;

/** The one unit in which first and last value of the column are start and stop of the preamble. */
function unitByRange(values: readonly number[], range: StatedRange | null, stepCount: number): Found<FrequencyUnit> | null {
  const [first, last] = [values[0] ?? NaN, values.at(-1) ?? NaN];
  if (range === null || range.unit === null || Number.isNaN(range.stopHz)) return null;
  const slackHz = Math.max(rangeTolerance * (range.stopHz - range.startHz), (2 * (range.stopHz - range.startHz)) / Math.max(stepCount, 1));
  const fitting = (['Hz', 'kHz', 'MHz', 'GHz'] as const).filter((unit) => Math.abs(Math.max(first, last) * hertzPerUnit[unit] - range.stopHz) <= slackHz && Math.abs(Math.min(first, last) * hertzPerUnit[unit] - range.startHz) <= slackHz);
  return fitting.length === 1 && fitting[0] ? { unit: fitting[0], how: `the values are those of ${range.how} in the preamble` } : null;
}

/** Frequencies within prose, such as "3 point scan, 20kHz-200MHz": the unit in which first and last value are two of them. */
function unitByProse(values: readonly number[], preamble: Preamble): Found<FrequencyUnit> | null {
  const said = preamble.lines.flatMap(({ text }) => [...text.matchAll(/(\d+(?:\.\d+)?)\s*([kMGT]?Hz)\b/gi)]).map((match) => Number(match[1]) * hertzPerUnit[frequencyUnitOf(match[2] ?? '') ?? 'Hz']);
  const isSaid = (hz: number): boolean => said.some((one) => Math.abs(one - hz) <= 0.01 * one);
  const fitting = (['Hz', 'kHz', 'MHz', 'GHz'] as const).filter((unit) => isSaid((values[0] ?? NaN) * hertzPerUnit[unit]) && isSaid((values.at(-1) ?? NaN) * hertzPerUnit[unit]));
  return fitting.length === 1 && fitting[0] ? { unit: fitting[0], how: 'the range that the comments state' } : null;
}

const surelyHertz = 1e8;

/**
 * The unit of the frequency column: glued to the cells or in the header, a line of the preamble, start and stop, prose; a column that
 * reaches 10⁸ can only be hertz. Otherwise a question.
 */
export function decideFrequencyUnit(notebook: Notebook, evidence: FrequencyEvidence): FrequencyUnit {
  const { rows, values } = evidence;
  const highest = Math.max(valueAt(values, 0), values.at(-1) ?? NaN);
  const show = (unit: FrequencyUnit): string => rows.frequency.map((value) => formatFrequency(value * hertzPerUnit[unit])).join('\n');
  const found = unitByWords(notebook, evidence, show) ?? unitByRange(values, evidence.range, rows.count - 1) ?? unitByProse(values, evidence.preamble) ?? unitBySize(highest);
  const unit = found?.unit ?? ask(notebook, {
    id: 'frequency-unit', code: 'unit-missing', message: 'The file does not tell the unit of its frequencies.', lines: rows.lines,
    choices: (['Hz', 'kHz', 'MHz', 'GHz'] as const).filter((one) => highest * hertzPerUnit[one] <= 1e12 && highest * hertzPerUnit[one] >= 1).map((id) => ({ id, label: id, sample: show(id) })),
  });
  notebook.transcription.frequencyUnit = unit;
  decide(notebook, 'frequencyUnit', found?.how ?? 'a person\u2019s answer');
  return unit;
}

/** What may tell the unit of the frequencies. */
export interface FrequencyEvidence {
  readonly headerText: string;
  readonly values: readonly number[];
  readonly preamble: Preamble;
  readonly range: StatedRange | null;
  readonly rows: RowsShown & { readonly count: number };
}

/** The unit in header or preamble; where start and stop contradict it, a person decides. */
function unitByWords(notebook: Notebook, { headerText, values, preamble, range, rows }: FrequencyEvidence, show: (unit: FrequencyUnit) => string): Found<FrequencyUnit> | null {
  const inHeader = frequencyUnitOf(headerText) ?? frequencyUnitIn(headerText);
  const key = entryOf(preamble, 'frequencyUnit');
  const byKey = key === null ? null : frequencyUnitIn(key.value);
  const stated: Found<FrequencyUnit>[] = [];
  if (inHeader !== null) stated.push({ unit: inHeader, how: 'the column\u2019s header' });
  if (byKey !== null && key !== null) stated.push({ unit: byKey, how: `line ${key.line + 1}` });
  if (stated.length === 0) return null;
  const byRange = unitByRange(values, range, rows.count - 1);
  const contradiction = byRange !== null && stated.every((one) => one.unit !== byRange.unit) ? [byRange] : [];
  return askConflict(notebook, { id: 'frequency-unit', lines: rows.lines, show }, [...stated, ...contradiction]);
}

function unitBySize(highest: number): Found<FrequencyUnit> | null {
  return highest >= surelyHertz ? { unit: 'Hz', how: 'the values are so large that they can only be hertz' } : null;
}

const titleLines = 6;

function levelUnitBeside(preamble: Preamble): Found<DeclaredLevelUnit> | null {
  for (const { text, line } of preamble.lines.slice(-titleLines).reverse()) {
    if (/default unit/i.test(text) || /offset|ref(?:erence)?[ .]*(?:level|pegel)|marker|limit|dB\/div|scale/i.test(text)) continue;
    const unit = levelUnitIn(text);
    const isTitle = /unit|trace|data|spur|ampl|level|pegel|y[- ]?axis/i.test(text);
    if (unit !== null && isTitle) return { unit, how: `line ${line + 1}: "${text.trim().slice(0, 60)}"` };
  }
  return null;
}

function levelUnitByPreamble(preamble: Preamble): Found<DeclaredLevelUnit> | null {
  return levelUnitByKey(preamble) ?? levelUnitBeside(preamble) ?? levelUnitByProse(preamble) ?? levelUnitByReference(preamble);
}

function levelUnitByKey(preamble: Preamble): Found<DeclaredLevelUnit> | null {
  const key = entryOf(preamble, 'levelUnit');
  const unit = key === null ? null : levelUnitIn(key.value);
  return key === null || unit === null ? null : { unit, how: `line ${key.line + 1}` };
}

function levelUnitByProse(preamble: Preamble): Found<DeclaredLevelUnit> | null {
  const isLogMagnitude = preamble.lines.some(({ text }) => /\blog(?:arithmic)? ?mag(?:nitude)?\b/i.test(text));
  return isLogMagnitude ? { unit: 'dB', how: 'the comments call the values log magnitude' } : null;
}

function levelUnitByReference(preamble: Preamble): Found<DeclaredLevelUnit> | null {
  const reference = entryOf(preamble, 'referenceLevel');
  const unit = reference === null ? null : (levelValue(reference.value, reference.keyText)?.unit ?? null);
  return reference === null || unit === null || unit === 'dB' ? null : { unit, how: `the reference level of line ${reference.line + 1}` };
}

const choices = ['dBm', 'dB\u00b5V', 'dB', 'dB\u00b5V/m', 'dBmV', 'V', 'mW'] as const;
const apartDb = 107;

/** A marker of the preamble that reads 107 dB off the same frequency's value: one of both is in the other unit. */
function markerContradicts(preamble: Preamble, unit: DeclaredLevelUnit, levelAt: (frequency: number) => number): boolean {
  const [where, what] = [entryOf(preamble, 'markerFrequency'), entryOf(preamble, 'markerLevel')];
  if (where === null || what === null || (unit !== 'dBm' && unit !== 'dB\u00b5V')) return false;
  const [frequency, level] = [where, what].map((entry) => Number.parseFloat(entry.value.split('|')[0] ?? ''));
  const offset = levelAt(frequency ?? NaN) - (level ?? NaN);
  return unit === 'dBm' && Math.abs(offset - apartDb) < 1;
}

function isContradicted(own: DeclaredLevelUnit, stated: Found<DeclaredLevelUnit> | null, preamble: Preamble): boolean {
  return stated !== null && stated.unit !== own && entryOf(preamble, 'levelUnit') !== null;
}

function isImplausible(middle: number, levels: readonly number[]): boolean {
  return middle > mostPlausibleDbm || isTinyAndPositive(levels);
}

const mostPlausibleDbm = 60;

/** Values between 0 and 1 throughout are powers or voltages rather than decibels. */
function isTinyAndPositive(levels: readonly number[]): boolean {
  return levels.length > 2 && levels.every((level) => level > 0 && level < 0.01);
}

/** The unit of a trace: glued or in its header, a line of the preamble, the trace's title, the reference level. Otherwise a question. */
export function decideLevelUnit(notebook: Notebook, { unitText, name, preamble, rows, levelAt, middle }: { unitText: string; name: string; preamble: Preamble; rows: RowsShown; levelAt: (frequency: number) => number; middle: number }): DeclaredLevelUnit {
  const show = (unit: DeclaredLevelUnit): string => rows.level.map((value) => `${value} ${unit}`).join('\n');
  const own = levelUnitIn(unitText);
  const stated = levelUnitByPreamble(preamble);
  const found = own !== null ? { unit: own, how: 'the column\u2019s header or cells' } : stated;
  if (own !== null && isContradicted(own, stated, preamble)) {
    return settle(notebook, askConflict(notebook, { id: 'level-unit', lines: rows.lines, show }, [{ unit: own, how: 'the column\u2019s header or cells' }, ...(stated === null ? [] : [stated])]));
  }
  if (found === null) {
    const unit = ask(notebook, { id: 'level-unit', code: 'unit-missing', message: `The file does not tell the unit of "${name}".`, lines: rows.lines, choices: choices.map((id) => ({ id, label: id, sample: show(id) })) });
    return settle(notebook, { unit, how: 'a person\u2019s answer' });
  }
  if (markerContradicts(preamble, found.unit, levelAt)) {
    doubt(notebook, { code: 'unit-contradicted', weight: 'doubt', message: `The declared unit ${found.unit} and the marker of the preamble are 107 dB apart.` });
    return settle(notebook, askConflict(notebook, { id: 'level-unit', lines: rows.lines, show }, [found, { unit: 'dB\u00b5V', how: 'the marker, 107 dB away' }]));
  }
  if (found.unit === 'dBm' && isImplausible(middle, rows.level)) {
    const unit = ask(notebook, { id: 'level-unit', code: 'implausible-level', message: `"${name}" is declared in dBm, and its values lie around ${Number(middle.toPrecision(3))}: no level in dBm is like that.`, lines: rows.lines, choices: [found.unit, 'dB\u00b5V' as const, 'mW' as const, 'V' as const].map((id) => ({ id, label: id, sample: show(id) })) });
    return settle(notebook, { unit, how: 'a person\u2019s answer' });
  }
  return settle(notebook, found);
}

function settle(notebook: Notebook, { unit, how }: Found<DeclaredLevelUnit>): DeclaredLevelUnit {
  notebook.transcription.levelUnit ??= unit;
  decide(notebook, 'levelUnit', how);
  return unit;
}
