import type { Curve } from '@leeside/contracts/curves';
import { formatNumber } from '@leeside/units/format-quantity';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../components/EmptyState';
import { Decibels, Frequency, FrequencyRange, NoFigure } from '../../components/Figure';
import { Passage } from '../../components/Passage';
import { readerLocale } from '../../components/reader-locale';
import { Remark, Remarks } from '../../components/Remarks';
import { Cell, HeadCell, Table } from '../../components/Table';

type Band = Curve['bands'][number];

const orNone = (db: number | null, atLeast: boolean) => (db === null ? <NoFigure why="too few points" /> : <Decibels db={db} atLeast={atLeast} />);

function BandRow({ band }: { band: Band }) {
  const { lowest } = band;
  return (
    <tr>
      <Cell><FrequencyRange {...band} /></Cell>
      <Cell>{band.kind}</Cell>
      <Cell figure>{lowest ? <Decibels db={lowest.attenuationDb} atLeast={lowest.atLeast} /> : <NoFigure why="nothing measured" />}</Cell>
      <Cell figure>{lowest ? <Frequency hz={lowest.frequencyHz} /> : <NoFigure />}</Cell>
      <Cell figure>{orNone(band.q10Db, band.q10AtLeast)}</Cell>
      <Cell figure>{orNone(band.medianDb, band.medianAtLeast)}</Cell>
      <Cell figure><span className="figure">{formatNumber(band.boundShare * 100, 0, readerLocale())}{'\u2009'}%</span></Cell>
      <Cell figure>{band.slopeDbPerDecade === null ? <NoFigure why="too few exact points" /> : <span className="figure">{formatNumber(band.slopeDbPerDecade, 1, readerLocale())}</span>}</Cell>
    </tr>
  );
}

export function Bands({ bands }: { bands: readonly Band[] }) {
  const remarks = (
    <Remarks about="the bands">
      <Remark weight="cite">Median and 10 % quantile after Kaplan and Meier, bounds right-censored: a quantile that is not reached is at least the largest value.</Remark>
    </Remarks>
  );
  return (
    <Passage title="Bands" count={bands.length} remarks={remarks}>
      {bands.length === 0 ? <EmptyState title="No band holds a reading" /> : (
        <Table caption="Bands of the curve">
          <thead>
            <tr>
              <HeadCell>Band</HeadCell><HeadCell>Kind</HeadCell><HeadCell figure>Lowest, dB</HeadCell><HeadCell figure>at</HeadCell>
              <HeadCell figure>10 % quantile, dB</HeadCell><HeadCell figure>Median, dB</HeadCell><HeadCell figure>Bounds</HeadCell><HeadCell figure>Slope, dB per decade</HeadCell>
            </tr>
          </thead>
          <tbody>{bands.map((band) => <BandRow key={`${band.kind} ${String(band.fromHz)}`} band={band} />)}</tbody>
        </Table>
      )}
    </Passage>
  );
}

export function Gaps({ gaps }: { gaps: Curve['gaps'] }) {
  return (
    <Passage title="Gaps" count={gaps.length}>
      {gaps.length === 0 ? <p className="text-sm text-faded">None: every stretch between the first and the last point has a number.</p> : (
        <Table caption="Stretches without a number">
          <thead><tr><HeadCell>Stretch</HeadCell><HeadCell>Why there is no number</HeadCell></tr></thead>
          <tbody>{gaps.map((gap) => <tr key={gap.fromHz}><Cell><FrequencyRange {...gap} /></Cell><Cell>{gap.reason}</Cell></tr>)}</tbody>
        </Table>
      )}
    </Passage>
  );
}

/** The way back: the files that the curve stands on, each with the fingerprint of its bytes. */
export function Inputs({ curve }: { curve: Curve }) {
  const remarks = (
    <Remarks about="the inputs">
      <Remark>Computed again from these bytes, this revision gives the same numbers.</Remark>
      {curve.analysisVersion && <Remark>Analysis <code>{curve.analysisVersion}</code>, revision {curve.revision}.</Remark>}
    </Remarks>
  );
  return (
    <Passage title="What it stands on" count={curve.inputs.length} remarks={remarks}>
      {curve.inputs.length === 0 ? <p className="text-sm text-faded">Typed levels alone; no file.</p> : (
        <Table caption="Files that the curve stands on">
          <thead><tr><HeadCell>Role</HeadCell><HeadCell>File</HeadCell><HeadCell>SHA-256</HeadCell></tr></thead>
          <tbody>
            {curve.inputs.map((input) => (
              <tr key={input.traceId}>
                <Cell>{input.role ?? 'sweep'}</Cell>
                <Cell><Link to={`/files/${input.fileId}`}>{input.name ?? 'How it was read'}</Link></Cell>
                <Cell><code className="text-xs break-all">{input.sha256}</code></Cell>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
    </Passage>
  );
}
