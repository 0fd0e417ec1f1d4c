import { measuringRoles } from '@leeside/contracts/measuring-roles';
import type { UploadFieldTexts } from '../../../api-client/upload-files';
import { SampleSelect } from '../../../components/SampleSelect';

const roleWords: Record<(typeof measuringRoles)[number], string> = {
  reference: 'reference: in the open', enclosed: 'enclosed: in the sample', noise: 'noise: generator off',
  leakage: 'leakage: receiver terminated', ambient: 'ambient: who else transmits',
};

interface BatchFieldsProps { fields: UploadFieldTexts; onFields: (fields: UploadFieldTexts) => void }

/** What the files of the next drop have in common. */
export function BatchFields({ fields, onFields }: BatchFieldsProps) {
  const set = (name: 'role' | 'sampleId' | 'condition') => (event: { target: { value: string } }) => onFields({ ...fields, [name]: event.target.value });
  const isEnclosed = !fields.role || fields.role === 'enclosed';
  return (
    <div className="grid gap-x-4 gap-y-2 text-sm desk:grid-cols-3">
      <label className="block font-semibold">They are
        <select className="field field-quiet mt-0.5 font-normal" value={fields.role ?? ''} onChange={set('role')}>
          <option value="">as their names say</option>
          {measuringRoles.map((role) => <option key={role} value={role}>{roleWords[role]}</option>)}
        </select>
      </label>
      <label className="block font-semibold">Sample
        <SampleSelect none="as their names say" className="field field-quiet mt-0.5 font-normal" value={fields.sampleId ?? ''} disabled={!isEnclosed} onChange={set('sampleId')} />
      </label>
      <label className="block font-semibold">Condition
        <input className="field field-quiet mt-0.5 font-normal" value={fields.condition ?? ''} maxLength={200} placeholder="for example: one roll" onChange={set('condition')} />
      </label>
    </div>
  );
}
