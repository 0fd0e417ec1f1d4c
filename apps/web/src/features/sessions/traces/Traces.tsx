import { listTraces, type Trace } from '@leeside/contracts/traces';
import { useApiQuery } from '../../../api-client/use-api-query';
import { useMay } from '../../../app/session-context';
import { Answered } from '../../../components/Answered';
import { Button } from '../../../components/Button';
import { EmptyState } from '../../../components/EmptyState';
import { Passage } from '../../../components/Passage';
import { Remark, Remarks } from '../../../components/Remarks';
import { TraceRow } from './TraceRow';
import { useChangeTrace, type TraceChange } from './use-change-trace';

const confirmation = ({ role, roleGuessed, sampleId, sampleGuessed }: Trace): TraceChange => ({
  ...(roleGuessed && role ? { role } : {}), ...(sampleGuessed && sampleId ? { sampleId } : {}),
});
const isGuessed = (trace: Trace): boolean => !trace.setAside && Object.keys(confirmation(trace)).length > 0;

function TraceRemarks({ traces }: { traces: readonly Trace[] }) {
  const unknown = traces.filter(({ role, setAside }) => role === null && !setAside).length;
  const guessed = traces.filter(isGuessed).length;
  return (
    <Remarks about="the traces">
      {unknown > 0 && <Remark weight="doubt">{unknown === 1 ? 'One trace has' : `${String(unknown)} traces have`} no role yet and {unknown === 1 ? 'is' : 'are'} in no curve.</Remark>}
      {guessed > 0 && <Remark weight="note">{guessed === 1 ? 'One trace was' : `${String(guessed)} traces were`} named by guess. The curves use the guess until you change it.</Remark>}
      <Remark>An enclosed sweep pairs with the reference that covers it and lies nearest in time. What the receive chain takes away (cable, pad, less the preamplifier) is the chain loss.</Remark>
    </Remarks>
  );
}

/** What each trace of the session is. */
export function Traces({ sessionId }: { sessionId: string }) {
  const query = useApiQuery(listTraces, { params: { id: sessionId } });
  const mayEdit = useMay('trace.edit');
  const change = useChangeTrace();
  const traces = query.data?.items ?? [];
  const guessed = traces.filter(isGuessed);
  const confirmAll = (): void => guessed.forEach((trace) => change.mutate({ params: { id: trace.id }, body: confirmation(trace) }));
  return (
    <Passage
      id="traces" title="Traces" count={query.data ? traces.length : undefined} remarks={<TraceRemarks traces={traces} />}
      actions={mayEdit && guessed.length > 1 && <Button kind="quiet" disabled={change.isPending} onClick={confirmAll}>All guesses are right</Button>}
    >
      <Answered query={query} what="the traces">
        {({ items }) => items.length === 0
          ? <EmptyState title="No trace yet">A trace stands here as soon as a file has been read.</EmptyState>
          : <ul className="list-none">{items.map((trace) => <TraceRow key={trace.id} trace={trace} mayEdit={mayEdit} showsName={items.filter(({ fileId }) => fileId === trace.fileId).length > 1} />)}</ul>}
      </Answered>
    </Passage>
  );
}
