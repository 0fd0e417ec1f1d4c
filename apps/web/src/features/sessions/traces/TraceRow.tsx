import type { Trace } from '@leeside/contracts/traces';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/Button';
import { ErrorState } from '../../../components/ErrorState';
import { Frequency, FrequencyRange, Level } from '../../../components/Figure';
import { StateMark } from '../../../components/StateMark';
import { InlineText } from './InlineText';
import { SetAsideDialog } from './SetAsideDialog';
import { TraceRole, TraceSample } from './TraceRole';
import { checkLevel, levelOrNull, levelText } from './typed-decibels';
import { useChangeTrace, type TraceChange } from './use-change-trace';

interface PartProps { trace: Trace; disabled: boolean; onChange: (change: TraceChange) => void }

function SetUp({ trace, disabled, onChange }: PartProps) {
  return (
    <div className="mt-2 grid grid-cols-2 gap-x-3 gap-y-2 desk:grid-cols-4">
      <InlineText label="Polarisation" value={trace.polarisation} disabled={disabled} onSave={(polarisation) => onChange({ polarisation })} />
      <InlineText label="Position" value={trace.position} disabled={disabled} onSave={(position) => onChange({ position })} />
      <InlineText label="Chain loss" unit="dB" value={levelText(trace.chainLossDb)} disabled={disabled} check={checkLevel('dB', -200, 200)} onSave={(text) => onChange({ chainLossDb: levelOrNull('dB')(text) })} />
      <InlineText label="Transmit level" unit="dBm" value={levelText(trace.transmitLevelDbm)} disabled={disabled} check={checkLevel('dBm', -200, 100)} onSave={(text) => onChange({ transmitLevelDbm: levelOrNull('dBm')(text) })} />
    </div>
  );
}

function TraceFacts({ trace, showsName }: { trace: Trace; showsName: boolean }) {
  return (
    <div className="min-w-0 desk:row-span-2">
      <Link to={`/files/${trace.fileId}`} className={`font-semibold wrap-anywhere ${trace.setAside ? 'line-through' : ''}`}>{trace.fileName}</Link>
      {showsName && <span className="ms-2 text-sm text-faded">{trace.name}</span>}
      <p className="text-xs text-faded">
        {trace.pointCount} {trace.pointCount === 1 ? 'point' : 'points'}, <FrequencyRange fromHz={trace.startHz} toHz={trace.stopHz} />
        <br />peak <Level level={trace.peak.level} unit={trace.levelUnit} /> at <Frequency hz={trace.peak.frequencyHz} />
      </p>
    </div>
  );
}

const setUpInWords = ({ polarisation, position, chainLossDb, transmitLevelDbm }: Trace): string =>
  [polarisation, position, chainLossDb !== null && `chain ${levelText(chainLossDb)}\u2009dB`, transmitLevelDbm !== null && `sent ${levelText(transmitLevelDbm)}\u2009dBm`]
    .filter(Boolean).join(', ') || 'not stated';

function Acts({ trace, mayEdit, onChange }: { trace: Trace; mayEdit: boolean; onChange: (change: TraceChange) => void }) {
  const [asking, setAsking] = useState(false);
  if (!mayEdit) return null;
  const name = <span className="sr-only"> {trace.fileName}</span>;
  if (trace.setAside !== undefined) return <Button kind="quiet" className="text-xs" onClick={() => onChange({ setAside: null })}>Bring back{name}</Button>;
  return (
    <>
      <Button kind="quiet" className="text-xs" onClick={() => setAsking(true)}>Set aside{name}</Button>
      {asking && <SetAsideDialog name={trace.fileName} onClose={() => setAsking(false)} onSetAside={(reason) => { setAsking(false); onChange({ setAside: reason }); }} />}
    </>
  );
}

/** One trace: what was measured, and what it is, edited where it stands. */
export function TraceRow({ trace, mayEdit, showsName }: { trace: Trace; mayEdit: boolean; showsName: boolean }) {
  const [open, setOpen] = useState(false);
  const change = useChangeTrace();
  const onChange = (body: TraceChange): void => change.mutate({ params: { id: trace.id }, body });
  const isEnclosed = trace.role === 'enclosed';
  const part = { trace, disabled: !mayEdit || trace.setAside !== undefined, onChange };
  return (
    <li className="border-b border-rule py-3">
      <div className="grid gap-x-4 gap-y-2 desk:grid-cols-[minmax(0,1.3fr)_minmax(8.5rem,0.8fr)_minmax(9rem,1fr)_minmax(8rem,1fr)]">
        <TraceFacts trace={trace} showsName={showsName} />
        <TraceRole {...part} />
        <TraceSample {...part} />
        {isEnclosed && <InlineText label="Condition" value={trace.condition} disabled={part.disabled} onSave={(condition) => onChange({ condition })} />}
        <div className={`flex flex-wrap items-center gap-x-3 ${isEnclosed ? 'desk:col-span-3 desk:col-start-2' : 'desk:col-span-2 desk:self-start desk:pt-5'}`}>
          {trace.setAside !== undefined && <span className="flex items-center gap-2 text-sm text-faded"><StateMark state="set aside" />{trace.setAside}</span>}
          <Button kind="quiet" className="-ms-1.5 text-xs" aria-expanded={open} onClick={() => setOpen(!open)}>{open ? 'Close the set-up' : `Set-up: ${setUpInWords(trace)}`}</Button>
          <Acts trace={trace} mayEdit={mayEdit} onChange={onChange} />
          <span role="status" className="text-xs text-faded">{change.isPending ? 'saving …' : change.isSuccess && 'saved'}</span>
        </div>
      </div>
      {open && <SetUp {...part} />}
      {change.isError && <ErrorState error={change.error} what="This was not saved" kept="The trace is as it was." />}
    </li>
  );
}
