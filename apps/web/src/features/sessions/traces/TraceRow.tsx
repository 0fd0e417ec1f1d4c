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

function TraceFacts({ trace }: { trace: Trace }) {
  const showsName = trace.name !== '' && trace.name !== trace.fileName;
  return (
    <div className="min-w-0">
      <Link to={`/files/${trace.fileId}`} className={`font-semibold wrap-anywhere ${trace.setAside ? 'line-through' : ''}`}>{trace.fileName}</Link>
      {showsName && <span className="ms-2 text-sm text-faded">{trace.name}</span>}
      <p className="text-xs text-faded">
        {trace.pointCount} {trace.pointCount === 1 ? 'point' : 'points'}, <FrequencyRange fromHz={trace.startHz} toHz={trace.stopHz} />
        <br />peak <Level level={trace.peak.level} unit={trace.levelUnit} /> at <Frequency hz={trace.peak.frequencyHz} />
      </p>
    </div>
  );
}

/** One trace: what was measured, and what it is, edited where it stands. */
export function TraceRow({ trace, mayEdit }: { trace: Trace; mayEdit: boolean }) {
  const [open, setOpen] = useState(trace.polarisation !== '' || trace.position !== '' || trace.chainLossDb !== null || trace.transmitLevelDbm !== null);
  const [asking, setAsking] = useState(false);
  const change = useChangeTrace();
  const onChange = (body: TraceChange): void => change.mutate({ params: { id: trace.id }, body });
  const disabled = !mayEdit || trace.setAside !== undefined;
  return (
    <li className="border-b border-rule py-3">
      <div className="grid gap-x-4 gap-y-2 desk:grid-cols-[minmax(0,1.3fr)_minmax(8.5rem,0.8fr)_minmax(9rem,1fr)_minmax(8rem,1fr)]">
        <TraceFacts trace={trace} />
        <TraceRole trace={trace} disabled={disabled} onChange={onChange} />
        <div><TraceSample trace={trace} disabled={disabled} onChange={onChange} /></div>
        <div>{trace.role === 'enclosed' && <InlineText label="Condition" value={trace.condition} disabled={disabled} onSave={(condition) => onChange({ condition })} />}</div>
      </div>
      {open && <SetUp trace={trace} disabled={disabled} onChange={onChange} />}
      <div className="mt-1 flex flex-wrap items-center gap-x-4">
        {trace.setAside !== undefined && <span className="flex items-center gap-2 text-sm text-faded"><StateMark state="set aside" />{trace.setAside}</span>}
        <Button kind="quiet" className="text-xs" aria-expanded={open} onClick={() => setOpen(!open)}>{open ? 'Less' : 'Set-up: polarisation, position, chain, transmit level'}</Button>
        {mayEdit && trace.setAside === undefined && <Button kind="quiet" className="text-xs" onClick={() => setAsking(true)}>Set aside<span className="sr-only"> {trace.fileName}</span></Button>}
        {mayEdit && trace.setAside !== undefined && <Button kind="quiet" className="text-xs" onClick={() => onChange({ setAside: null })}>Bring back<span className="sr-only"> {trace.fileName}</span></Button>}
        <span role="status" className="text-xs text-faded">{change.isPending ? 'saving …' : change.isSuccess ? 'saved' : ''}</span>
      </div>
      {change.isError && <ErrorState error={change.error} what="This was not saved" kept="The trace is as it was." />}
      {asking && <SetAsideDialog name={trace.fileName} onClose={() => setAsking(false)} onSetAside={(reason) => { setAsking(false); onChange({ setAside: reason }); }} />}
    </li>
  );
}
