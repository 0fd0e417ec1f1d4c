import { measuringRoles, type MeasuringRole } from '@leeside/contracts/measuring-roles';
import type { Trace } from '@leeside/contracts/traces';
import { Button } from '../../../components/Button';
import { SampleSelect } from '../../../components/SampleSelect';
import type { TraceChange } from './use-change-trace';

interface ChoiceProps { trace: Trace; disabled: boolean; onChange: (change: TraceChange) => void }

/** A guess stands out until somebody says that it is right. */
function Guess({ what, disabled, onConfirm }: { what: string; disabled: boolean; onConfirm: () => void }) {
  return (
    <span className="flex items-center gap-1 text-xs text-ochre">
      a guess
      {!disabled && <Button kind="quiet" className="min-h-6! text-xs" onClick={onConfirm}>Right<span className="sr-only">, the {what} is right</span></Button>}
    </span>
  );
}

const guessLook = (guessed: boolean): string => (guessed ? 'border-dashed! border-ochre!' : '');

export function TraceRole({ trace, disabled, onChange }: ChoiceProps) {
  const { role } = trace;
  return (
    <label className="block text-xs text-faded">
      Role
      <select className={`field field-quiet text-ink ${guessLook(trace.roleGuessed)}`} value={role ?? ''} disabled={disabled} onChange={(event) => onChange({ role: event.target.value as MeasuringRole })}>
        {role === null && <option value="" disabled>not known yet</option>}
        {measuringRoles.map((word) => <option key={word} value={word}>{word}</option>)}
      </select>
      {trace.roleGuessed && role && <Guess what="role" disabled={disabled} onConfirm={() => onChange({ role })} />}
    </label>
  );
}

export function TraceSample({ trace, disabled, onChange }: ChoiceProps) {
  if (trace.role !== 'enclosed') return null;
  const { sampleId } = trace;
  return (
    <label className="block text-xs text-faded">
      Sample
      <SampleSelect none="none" className={`field field-quiet text-ink ${guessLook(trace.sampleGuessed)}`} value={sampleId ?? ''} disabled={disabled} onChange={(event) => onChange({ sampleId: event.target.value || null })} />
      {trace.sampleGuessed && sampleId && <Guess what="sample" disabled={disabled} onConfirm={() => onChange({ sampleId })} />}
    </label>
  );
}
