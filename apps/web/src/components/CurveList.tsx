import type { CurveSummary } from '@leeside/contracts/curves';
import { Link } from 'react-router-dom';
import { Attenuation, Frequency, NoFigure } from './Figure';
import { OutcomeMark } from './OutcomeMark';
import { StateMark } from './StateMark';
import { Cell, HeadCell, Table } from './Table';

const weightOf = (curve: CurveSummary): string | null =>
  ['stops signing', 'doubt', 'note'].find((weight) => curve.doubts.some((doubt) => doubt.weight === weight)) ?? null;

const weightLooks: Record<string, string> = { 'stops signing': 'text-plum font-semibold', 'doubt': 'text-ochre font-semibold', 'note': 'text-slate' };

function Doubts({ curve }: { curve: CurveSummary }) {
  const weight = weightOf(curve);
  if (!weight) return <NoFigure why="no doubts" />;
  const more = curve.doubts.length - 1;
  const first = curve.doubts.find((doubt) => doubt.weight === weight);
  return <span className="text-xs"><span className={weightLooks[weight] ?? ''}>{weight}</span>: {first?.message}{more > 0 && ` (+ ${String(more)} more)`}</span>;
}

function Standing({ curve }: { curve: CurveSummary }) {
  if (curve.state === 'ready') return <OutcomeMark outcome={curve.outcome} />;
  return <StateMark state={curve.state === 'failed' ? 'no curve yet' : curve.state} />;
}

function CurveRow({ curve, named }: { curve: CurveSummary; named: 'sample' | 'session' }) {
  const lowest = curve.state === 'ready' ? curve.lowest : null;
  const name = named === 'sample' ? (curve.sampleCode ?? 'Without a sample') : curve.sessionTitle;
  return (
    <tr data-state={curve.state}>
      <Cell><Link to={`/curves/${curve.id}`} className="font-semibold">{name}</Link>{curve.condition && <span className="block text-xs text-faded">{curve.condition}</span>}</Cell>
      <Cell><Standing curve={curve} /></Cell>
      <Cell figure>{lowest ? <Attenuation db={lowest.attenuationDb} atLeast={lowest.atLeast} /> : <NoFigure why="not computed" />}</Cell>
      <Cell figure>{lowest ? <Frequency hz={lowest.frequencyHz} /> : <NoFigure why="not computed" />}</Cell>
      <Cell className="min-w-52">{curve.state === 'failed' ? <span className="text-xs">{curve.failure}</span> : <Doubts curve={curve} />}</Cell>
    </tr>
  );
}

/** Curves with their outcome, their lowest value and what is doubted about them. */
export function CurveList({ curves, named }: { curves: readonly CurveSummary[]; named: 'sample' | 'session' }) {
  return (
    <Table caption="Curves">
      <thead><tr><HeadCell>{named === 'sample' ? 'Sample, condition' : 'Session, condition'}</HeadCell><HeadCell>Outcome</HeadCell><HeadCell figure>Lowest</HeadCell><HeadCell figure>at</HeadCell><HeadCell>Doubts</HeadCell></tr></thead>
      <tbody>{curves.map((curve) => <CurveRow key={curve.id} curve={curve} named={named} />)}</tbody>
    </Table>
  );
}
