import { listCurves } from '@leeside/contracts/curves';
import { listLevels, removeLevel, type TypedLevelBody } from '@leeside/contracts/levels';
import { listSamples } from '@leeside/contracts/samples';
import { getSession } from '@leeside/contracts/sessions';
import { useState } from 'react';
import { useApiChange } from '../../../api-client/use-api-change';
import { useApiQuery } from '../../../api-client/use-api-query';
import { useMay } from '../../../app/session-context';
import { Answered } from '../../../components/Answered';
import { Button } from '../../../components/Button';
import { Dialog } from '../../../components/Dialog';
import { Frequency, Level, NoFigure } from '../../../components/Figure';
import { Passage } from '../../../components/Passage';
import { Remark, Remarks } from '../../../components/Remarks';
import { Cell, HeadCell, Table } from '../../../components/Table';
import { LevelForm } from './LevelForm';

interface LevelRowProps { level: TypedLevelBody; sampleCode: string | null; onRemove: (() => void) | null }

function LevelRow({ level, sampleCode, onRemove }: LevelRowProps) {
  return (
    <tr>
      <Cell>{level.role}</Cell>
      <Cell>{[sampleCode, level.condition].filter(Boolean).join(', ') || <NoFigure />}</Cell>
      <Cell figure><Frequency hz={level.frequencyHz} /></Cell>
      <Cell figure><Level level={level.levelDbm} unit="dBm" /></Cell>
      <Cell>{level.inTheNoise ? 'in the noise' : ''}</Cell>
      <Cell figure>{onRemove && <Button kind="quiet" className="min-h-6! text-xs" onClick={onRemove}>Take out<span className="sr-only"> the {level.role} level</span></Button>}</Cell>
    </tr>
  );
}

function LevelTable({ levels, mayType }: { levels: readonly TypedLevelBody[]; mayType: boolean }) {
  const samples = useApiQuery(listSamples, { query: { limit: 200 } }, { staleTime: 60_000 });
  const [leaving, setLeaving] = useState<TypedLevelBody | null>(null);
  const remove = useApiChange(removeLevel, [listLevels, listCurves, getSession]);
  const codeOf = (id: string | null) => samples.data?.items.find((sample) => sample.id === id)?.code ?? null;
  return (
    <>
      <Table caption="Typed levels">
        <thead><tr><HeadCell>Role</HeadCell><HeadCell>Sample, condition</HeadCell><HeadCell figure>Frequency</HeadCell><HeadCell figure>Level</HeadCell><HeadCell>Mark</HeadCell><HeadCell><span className="sr-only">Act</span></HeadCell></tr></thead>
        <tbody>{levels.map((level) => <LevelRow key={level.id} level={level} sampleCode={codeOf(level.sampleId)} onRemove={mayType ? () => setLeaving(level) : null} />)}</tbody>
      </Table>
      {leaving && (
        <Dialog title="Take this level out" onClose={() => setLeaving(null)} confirm={{ word: 'Take it out', grave: true, onConfirm: () => { remove.mutate({ params: { id: leaving.id } }); setLeaving(null); } }}>
          <p>{leaving.role}, <Frequency hz={leaving.frequencyHz} />, <Level level={leaving.levelDbm} unit="dBm" />. It cannot be brought back, only typed again.</p>
        </Dialog>
      )}
    </>
  );
}

/** Levels read off the screen, typed in with their frequency. */
export function Levels({ sessionId }: { sessionId: string }) {
  const query = useApiQuery(listLevels, { params: { id: sessionId } });
  const mayType = useMay('level.type');
  const [typing, setTyping] = useState(false);
  const remarks = (
    <Remarks about="typed levels">
      <Remark>{'“2.4\u00a0GHz”, “2,4\u00a0GHz” and “433.92M” are all understood, and so is “−31\u00a0dBm”.'}</Remark>
      <Remark>An enclosed level marked “in the noise” gives a bound with the level typed <em>(common practice, no source)</em>.</Remark>
    </Remarks>
  );
  return (
    <Passage id="levels" title="Typed levels" count={query.data?.items.length} remarks={remarks} actions={mayType && <Button kind="quiet" aria-expanded={typing} onClick={() => setTyping(!typing)}>{typing ? 'Close the form' : 'Type a level'}</Button>}>
      {typing && <LevelForm sessionId={sessionId} />}
      <Answered query={query} what="the typed levels">
        {({ items }) => items.length > 0 ? <LevelTable levels={items} mayType={mayType} /> : <p className="text-sm text-faded">None typed. This is for a reading taken by eye, without a file.</p>}
      </Answered>
    </Passage>
  );
}
