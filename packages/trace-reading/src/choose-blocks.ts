import type { DataBlock } from './data-blocks.js';
import { findHeader } from './header-line.js';
import { doubt, type Notebook } from './notebook.js';
import { refuse } from './reading-fault.js';
import { readRow, separatorChoices, type Separators } from './separators.js';
import { lineAt, type TextLines } from './text-lines.js';

const otherTable = /limit|marker|marke[rn]?\b|peak (?:list|table)|grenz|mask|correction|korrektur|transducer|loss table/i;

/** The lines between a block and the one before it. */
function titleOf(lines: TextLines, block: DataBlock, previous: DataBlock | undefined): string[] {
  const from = previous === undefined ? 0 : previous.lastLine + 1;
  return Array.from({ length: block.firstLine - from }, (_, at) => lineAt(lines, from + at)).filter((text) => text.trim() !== '');
}

/**
 * The blocks that are traces: the longest that is no table of limits, markers or corrections, and those after it with the same header.
 * What is passed over is said.
 */
export function chooseBlocks(notebook: Notebook, lines: TextLines, blocks: readonly DataBlock[], separators: Separators): DataBlock[] {
  const titled = blocks.map((block, at) => ({ block, title: titleOf(lines, block, blocks[at - 1]).slice(-3) }));
  const mayBe = titled.filter(({ block, title }) => blocks.length === 1 || !title.some((text) => otherTable.test(text)) || block.rowCount > 100);
  const main = (mayBe.length > 0 ? mayBe : titled).reduce((best, one) => (one.block.rowCount > best.block.rowCount ? one : best));
  const headerText = (block: DataBlock): string => {
    const header = findHeader(lines, block, separators);
    return header === null ? '' : lineAt(lines, header.line).trim().toLowerCase();
  };
  const mainHeader = headerText(main.block);
  const stacked = mayBe.filter(({ block, title }) => block !== main.block && block.columns.length === main.block.columns.length && block.rowCount >= Math.max(2, main.block.rowCount / 4)
    && ((mainHeader !== '' && headerText(block) === mainHeader) || title.some((text) => /trace|spur|kurve|sweep|courbe/i.test(text))));
  const chosen = [main.block, ...stacked.map(({ block }) => block)].sort((one, other) => one.firstLine - other.firstLine);
  for (const { block } of titled) {
    if (chosen.includes(block)) continue;
    notebook.transcription.rowsSkipped += block.rowCount;
    doubt(notebook, { code: 'other-table', weight: 'note', message: `Lines ${block.firstLine + 1} to ${block.lastLine + 1} are another table and were passed over.`, line: block.firstLine + 1 });
  }
  refuseOtherSeparators(lines, main.block);
  noteTail(notebook, lines, blocks.at(-1));
  return chosen;
}

/** Rows of the same width that follow at once, separated in another way: the file changes its manner in the middle. */
function refuseOtherSeparators(lines: TextLines, { lastLine, columns }: DataBlock): void {
  const text = lineAt(lines, lastLine + 1);
  if (columns.length < 2 || text.trim() === '') return;
  if (separatorChoices.some((separators) => readRow(text, separators)?.length === columns.length)) throw refuse('mixed-delimiters', `Line ${lastLine + 2} is separated in another way than the lines before it.`, lastLine + 2);
}

const knownEnd = /^\W*(?:END|BEGIN|EOF|\[End\]|Trace (?:Name|Type|Data))\b/i;

function noteTail(notebook: Notebook, lines: TextLines, last: DataBlock | undefined): void {
  if (last === undefined) return;
  const rest = Array.from({ length: lines.count - last.lastLine - 1 }, (_, at) => last.lastLine + 1 + at).filter((line) => lineAt(lines, line).trim() !== '' && !knownEnd.test(lineAt(lines, line)));
  const [first] = rest;
  if (first === undefined) return;
  doubt(notebook, { code: 'lines-after-data', weight: 'note', message: `${rest.length} line${rest.length === 1 ? '' : 's'} after the data ${rest.length === 1 ? 'was' : 'were'} passed over: ${first + 1} to ${(rest.at(-1) ?? first) + 1}.`, line: first + 1 });
}
