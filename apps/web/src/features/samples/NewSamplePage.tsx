import { listClients, listLots } from '@leeside/contracts/intake';
import { createSample, listSamples } from '@leeside/contracts/samples';
import { useNavigate } from 'react-router-dom';
import { useApiChange } from '../../api-client/use-api-change';
import { useApiQuery } from '../../api-client/use-api-query';
import { Button, LinkButton } from '../../components/Button';
import { ErrorSummary } from '../../components/ErrorSummary';
import { SelectField, TextArea, TextField } from '../../components/Field';
import { useNotebookForm } from '../../components/form/use-notebook-form';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { Remark, Remarks } from '../../components/Remarks';
import { emptySample, sampleBody, sampleFormSchema } from './sample-form-schema';

const remarks = (
  <Remarks about="a new sample">
    <Remark>An enclosed sweep whose file name holds this code is taken to be of this sample.</Remark>
    <Remark>The inside size tells at which frequencies the enclosure itself resonates.</Remark>
    <Remark weight="caution">Metallised liners conduct: no bare contacts, antennas or charging ports against them. Cells sealed into a bag get hot; watch them.</Remark>
  </Remarks>
);

export function NewSamplePage() {
  const navigate = useNavigate();
  const lots = useApiQuery(listLots, {});
  const clients = useApiQuery(listClients, {});
  const create = useApiChange(createSample, [listSamples]);
  const { field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'new-sample', schema: sampleFormSchema, empty: emptySample,
    save: async (values) => {
      const { id } = await create.mutateAsync({ body: sampleBody(values) });
      await navigate(`/samples/${id}`);
    },
  });
  return (
    <>
      <PageHead title="Take a sample in" folio="Samples" />
      <Passage title="What came" remarks={remarks}>
        <form onSubmit={submit} noValidate>
          <ErrorSummary errors={errors} attempt={attempt} />
          <TextField label="Code" hint="As it stands on the sample; one of its kind in the lab." className="figure" {...field('code')} />
          <TextField label="Name" {...field('name')} />
          <SelectField label="Lot" optional {...field('lotId')}><option value="">none</option>{lots.data?.items.map((lot) => <option key={lot.id} value={lot.id}>{lot.code} · {lot.designName}</option>)}</SelectField>
          <SelectField label="Client" optional {...field('clientId')}><option value="">none</option>{clients.data?.items.map((client) => <option key={client.id} value={client.id}>{client.name}</option>)}</SelectField>
          <fieldset>
            <legend className="mb-2 text-sm font-semibold">Inside size <span className="font-normal text-faded">(may be left out)</span></legend>
            <div className="grid max-w-xl gap-x-4 desk:grid-cols-3">
              <TextField label="Width" unit="mm" inputMode="decimal" className="figure text-end" {...field('widthMm')} />
              <TextField label="Height" unit="mm" inputMode="decimal" className="figure text-end" {...field('heightMm')} />
              <TextField label="Depth" unit="mm" inputMode="decimal" className="figure text-end" {...field('depthMm')} />
            </div>
          </fieldset>
          <TextArea label="Notes" optional hint="For the lab alone; the client does not see them." {...field('notes')} />
          <div className="flex gap-3"><Button kind="main" type="submit" disabled={saving}>{saving ? 'Taking in …' : 'Take it in'}</Button><LinkButton to="/samples">Not now</LinkButton></div>
        </form>
      </Passage>
    </>
  );
}
