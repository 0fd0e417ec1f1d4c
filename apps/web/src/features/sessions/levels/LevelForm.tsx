import { listCurves } from '@leeside/contracts/curves';
import { addLevels, listLevels } from '@leeside/contracts/levels';
import { measuringRoles } from '@leeside/contracts/measuring-roles';
import { getSession } from '@leeside/contracts/sessions';
import { useApiChange } from '../../../api-client/use-api-change';
import { Button } from '../../../components/Button';
import { ErrorSummary } from '../../../components/ErrorSummary';
import { FieldFrame, SelectField, TextField } from '../../../components/Field';
import { useNotebookForm } from '../../../components/form/use-notebook-form';
import { SampleSelect } from '../../../components/SampleSelect';
import { emptyLevel, levelBody, levelFormSchema } from './level-form-schema';

/** A level read off the screen by eye. What it is stays for the next one; the numbers start anew. */
export function LevelForm({ sessionId }: { sessionId: string }) {
  const add = useApiChange(addLevels, [listLevels, listCurves, getSession]);
  const { form, field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'typed-level', schema: levelFormSchema, empty: emptyLevel,
    save: async (values) => {
      await add.mutateAsync({ params: { id: sessionId }, body: { items: [levelBody(values)] } });
      form.reset({ ...form.getValues(), frequency: '', level: '', inTheNoise: false });
      form.setFocus('frequency');
    },
  });
  const isEnclosed = form.watch('role') === 'enclosed';
  return (
    <form onSubmit={submit} noValidate className="mb-6 border border-rule bg-sheet p-4 pb-1">
      <ErrorSummary errors={errors} attempt={attempt} />
      <div className="grid gap-x-5 desk:grid-cols-3">
        <SelectField label="Role" {...field('role')}>{measuringRoles.map((role) => <option key={role}>{role}</option>)}</SelectField>
        {isEnclosed && <FieldFrame id="typed-level-sampleId" label="Sample"><SampleSelect none="none" {...form.register('sampleId')} id="typed-level-sampleId" /></FieldFrame>}
        {isEnclosed && <TextField label="Condition" optional {...field('condition')} />}
      </div>
      <div className="grid items-end gap-x-5 desk:grid-cols-3">
        <TextField label="Frequency" inputMode="decimal" placeholder="433.92 MHz" className="figure text-end" autoComplete="off" {...field('frequency')} />
        <TextField label="Level" unit="dBm" inputMode="decimal" placeholder="−31" className="figure text-end" autoComplete="off" {...field('level')} />
        <div className="mb-5 flex min-h-10 flex-wrap items-center gap-4">
          {isEnclosed && <label className="flex items-center gap-2 text-sm"><input type="checkbox" className="size-5 accent-copper" {...form.register('inTheNoise')} />in the noise</label>}
          <Button type="submit" disabled={saving}>{saving ? 'Noting …' : 'Note it down'}</Button>
        </div>
      </div>
    </form>
  );
}
