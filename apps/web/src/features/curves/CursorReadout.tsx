import type { ReactNode } from 'react';
import { Attenuation, Frequency, Level, NoFigure } from '../../components/Figure';
import type { CursorReading } from './cursor-reading';

function Part({ name, children, strong = false }: { name: string; children: ReactNode; strong?: boolean }) {
  return (
    <div className="min-w-24">
      <dt className="text-xs text-faded">{name}</dt>
      <dd className={`leading-8 ${strong ? 'text-lg font-semibold' : ''}`}>{children}</dd>
    </div>
  );
}

const decibels = (db: number | null, why: string): ReactNode => (db === null ? <NoFigure why={why} /> : <Level level={db} unit="dB" />);

/** What the cursor reads, in a line of its own that never changes its height. */
export function CursorReadout({ reading }: { reading: CursorReading | null }) {
  if (!reading) return <p className="min-h-14 text-sm text-faded">No point here.</p>;
  const { hz, attenuationDb, atLeast, atMostDb, ceilingDb, uncertaintyDb, requiredDb, marginDb } = reading;
  const short = marginDb !== null && marginDb < 0;
  return (
    <dl className="flex min-h-14 flex-wrap items-end gap-x-5 gap-y-1" data-testid="cursor-readout">
      <Part name="at" strong><Frequency hz={hz} /></Part>
      <Part name="attenuation" strong><Attenuation db={attenuationDb} atLeast={atLeast} /></Part>
      {atMostDb !== null && <Part name="at most"><Level level={atMostDb} unit="dB" /></Part>}
      <Part name="uncertainty">{uncertaintyDb === null ? <NoFigure why="not stated" /> : <span className="figure">±<Level level={uncertaintyDb} unit="dB" /></span>}</Part>
      <Part name="ceiling">{decibels(ceilingDb, 'not known without a floor')}</Part>
      <Part name="required">{decibels(requiredDb, 'nothing required here')}</Part>
      <Part name="margin">{marginDb === null ? <NoFigure why="nothing required here" /> : <span className={short ? 'font-semibold text-plum' : ''}><Attenuation db={marginDb} atLeast={atLeast} /></span>}</Part>
    </dl>
  );
}
