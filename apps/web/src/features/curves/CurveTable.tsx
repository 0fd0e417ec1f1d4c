import type { CurvePointsBody } from '@leeside/contracts/curves';
import { useState } from 'react';
import { Button } from '../../components/Button';
import { alignedFrequencies } from '../../components/aligned-frequencies';
import { Decibels, NoFigure } from '../../components/Figure';
import { readerLocale } from '../../components/reader-locale';
import { Cell, HeadCell, Table } from '../../components/Table';
import type { RowChoice } from './curve-view-in-address';
import { chosenRows, readingAt } from './cursor-reading';

interface CurveTableProps { points: CurvePointsBody; cursorAt: number; onCursor: (hz: number) => void; rows: RowChoice; onRows: (rows: RowChoice) => void }

const pageSize = 20;
const words: Record<RowChoice, string> = { all: 'all points', bounds: 'bounds alone (≥)', below: 'below the requirement' };

const orDash = (db: number | null, why: string) => (db === null ? <NoFigure why={why} /> : <Decibels db={db} />);

interface PointRowProps { points: CurvePointsBody; at: number; frequency: string; marked: boolean; onCursor: (hz: number) => void }

function PointRow({ points, at, frequency, marked, onCursor }: PointRowProps) {
  const reading = readingAt(points, at);
  if (!reading) return null;
  return (
    <tr aria-current={marked ? 'true' : undefined} data-bound={reading.atLeast} className={marked ? 'bg-paper outline-2 -outline-offset-2 outline-copper' : ''}>
      <Cell figure className="ps-2!"><button type="button" className="figure font-semibold text-copper hover:underline" title={`${String(reading.hz)} Hz`} onClick={() => onCursor(reading.hz)}>{frequency}</button></Cell>
      <Cell figure><Decibels db={reading.attenuationDb} atLeast={reading.atLeast} decimals={2} /></Cell>
      <Cell figure>{orDash(reading.uncertaintyDb, 'not stated')}</Cell>
      <Cell figure>{orDash(reading.ceilingDb, 'not known')}</Cell>
      <Cell figure>{orDash(reading.requiredDb, 'nothing required')}</Cell>
      <Cell figure className="pe-2!">{reading.marginDb === null ? <NoFigure why="nothing required" /> : <Decibels db={reading.marginDb} atLeast={reading.atLeast} />}</Cell>
    </tr>
  );
}

/** The page of rows that holds the cursor, unless another page was turned to since the cursor moved. */
function usePage(indices: readonly number[], cursorAt: number): [number, number, (page: number) => void] {
  const [turned, setTurned] = useState<{ to: number; cursorAt: number } | null>(null);
  const pages = Math.max(1, Math.ceil(indices.length / pageSize));
  const place = indices.findIndex((at) => at >= cursorAt);
  const ofCursor = Math.floor((place < 0 ? indices.length - 1 : place) / pageSize);
  const page = turned && turned.cursorAt === cursorAt ? turned.to : ofCursor;
  return [Math.min(Math.max(0, page), pages - 1), pages, (to) => setTurned({ to, cursorAt })];
}

/** The same numbers as the plot, page by page; the page follows the plot's cursor. */
export function CurveTable({ points, cursorAt, onCursor, rows, onRows }: CurveTableProps) {
  const indices = chosenRows(points, rows);
  const [page, pages, turnTo] = usePage(indices, cursorAt);
  const onPage = indices.slice(page * pageSize, (page + 1) * pageSize);
  const frequencies = alignedFrequencies(onPage.map((at) => points.frequencyHz[at] ?? NaN), readerLocale());
  return (
    <>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-3 text-sm">
        <label className="flex items-center gap-2" htmlFor="row-choice">Show
          <select id="row-choice" className="field field-quiet w-auto!" value={rows} onChange={(event) => onRows(event.target.value as RowChoice)}>
            {Object.entries(words).map(([choice, word]) => <option key={choice} value={choice}>{word}</option>)}
          </select>
        </label>
        <span className="flex items-center gap-2">
          <Button kind="quiet" disabled={page === 0} onClick={() => turnTo(page - 1)}>Lower frequencies</Button>
          <span className="figure text-faded">{page + 1} / {pages}</span>
          <Button kind="quiet" disabled={page >= pages - 1} onClick={() => turnTo(page + 1)}>Higher frequencies</Button>
        </span>
      </div>
      {indices.length === 0 ? <p className="py-4 text-sm text-faded">{rows === 'bounds' ? 'No bound in this window: every number here is exact.' : 'Nothing in this window lies below the requirement.'}</p> : (
        <Table caption="Points of the curve">
          <thead><tr>{['Frequency', 'Attenuation, dB', 'Uncertainty, ± dB', 'Ceiling, dB', 'Required, dB', 'Margin, dB'].map((head) => <HeadCell key={head} figure>{head}</HeadCell>)}</tr></thead>
          <tbody>
            {onPage.map((at, row) => <PointRow key={at} points={points} at={at} frequency={frequencies[row] ?? ''} marked={at === cursorAt} onCursor={onCursor} />)}
          </tbody>
        </Table>
      )}
    </>
  );
}
