import { createRequirement, listRequirements } from '@leeside/contracts/requirements';
import { useFieldArray } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { useApiChange } from '../../api-client/use-api-change';
import { Button, LinkButton } from '../../components/Button';
import { ErrorSummary } from '../../components/ErrorSummary';
import { SelectField, TextField } from '../../components/Field';
import { useNotebookForm, type NotebookForm } from '../../components/form/use-notebook-form';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { emptyRequirement, emptySegment, requirementBody, requirementFormSchema, type RequirementFormInput } from './requirement-form-schema';
import { RuleRemarks } from './RuleRemarks';

type Form = NotebookForm<RequirementFormInput, ReturnType<typeof requirementFormSchema.parse>>;

function Segment({ at, field, onRemove }: { at: number; field: Form['field']; onRemove: (() => void) | null }) {
  const figure = { inputMode: 'decimal', className: 'figure text-end', autoComplete: 'off' } as const;
  return (
    <fieldset className="mb-4 max-w-3xl border border-rule bg-sheet px-4 pt-3">
      <legend className="px-1 text-sm font-semibold">Segment {at + 1}</legend>
      <div className="grid gap-x-4 desk:grid-cols-4">
        <TextField label="From" placeholder="100 kHz" {...figure} {...field(`segments.${at}.from`)} />
        <TextField label="to" placeholder="1 GHz" {...figure} {...field(`segments.${at}.to`)} />
        <TextField label="at least, from" unit="dB" {...figure} {...field(`segments.${at}.fromDb`)} />
        <TextField label="at least, to" unit="dB" {...figure} {...field(`segments.${at}.toDb`)} />
      </div>
      {onRemove && <Button kind="quiet" className="mb-3" onClick={onRemove}>Take segment {at + 1} out</Button>}
    </fieldset>
  );
}

export function NewRequirementPage() {
  const navigate = useNavigate();
  const create = useApiChange(createRequirement, [listRequirements]);
  const { form, field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'new-requirement', schema: requirementFormSchema, empty: emptyRequirement,
    save: async (values) => {
      const { id } = await create.mutateAsync({ body: requirementBody(values) });
      await navigate(`/requirements/${id}`);
    },
  });
  const segments = useFieldArray({ control: form.control, name: 'segments' });
  return (
    <>
      <PageHead title="State a requirement" folio="Requirements" />
      <Passage title="What is asked for" remarks={<RuleRemarks />}>
        <form onSubmit={submit} noValidate>
          <ErrorSummary errors={errors} attempt={attempt} />
          <TextField label="Name" {...field('name')} />
          <SelectField label="Decision rule" {...field('rule')}><option value="simple">simple</option><option value="guarded">guarded</option></SelectField>
          {form.watch('rule') === 'guarded' && <TextField label="Guard factor" hint="Times the expanded uncertainty." inputMode="decimal" className="figure w-28! text-end" {...field('guardFactor')} />}
          {segments.fields.map((segment, at) => <Segment key={segment.id} at={at} field={field} onRemove={segments.fields.length > 1 ? () => segments.remove(at) : null} />)}
          <p className="mb-6"><Button onClick={() => segments.append(emptySegment)}>Add a segment</Button></p>
          <div className="flex gap-3"><Button kind="main" type="submit" disabled={saving}>{saving ? 'Saving …' : 'State it'}</Button><LinkButton to="/requirements">Not now</LinkButton></div>
        </form>
      </Passage>
    </>
  );
}
