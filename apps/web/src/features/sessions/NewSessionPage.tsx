import { listRequirements } from '@leeside/contracts/requirements';
import { createSession, listSessions } from '@leeside/contracts/sessions';
import { getToday } from '@leeside/contracts/today';
import { useState } from 'react';
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
import { sessionBody, sessionFormSchema, type SessionFormInput } from './session-form-schema';

const todayOnWall = (): string => new Intl.DateTimeFormat('sv-SE').format(new Date());

const remarks = (
  <Remarks about="a new session">
    <Remark>The requirement is fixed before the session, and with it the decision rule.</Remark>
    <Remark>The floor margin says how far above the noise floor a level must stand to be told from it. 6 dB unless the lab has a reason.</Remark>
    <Remark weight="caution">Transmitting needs a licence, an exempt band or a screened room. The lab answers to its local regulator.</Remark>
  </Remarks>
);

export function NewSessionPage() {
  const navigate = useNavigate();
  const requirements = useApiQuery(listRequirements, { query: { limit: 200 } });
  const create = useApiChange(createSession, [listSessions, getToday]);
  const [empty] = useState<SessionFormInput>(() => ({ title: '', heldOn: todayOnWall(), requirementId: '', impedanceOhm: '50', floorMarginDb: '6', notes: '' }));
  const { field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'new-session', schema: sessionFormSchema, empty,
    save: async (values) => {
      const { id } = await create.mutateAsync({ body: sessionBody(values) });
      await navigate(`/sessions/${id}`);
    },
  });
  return (
    <>
      <PageHead title="New session" folio="Sessions" />
      <Passage title="What will be measured" remarks={remarks}>
        <form onSubmit={submit} noValidate>
          <ErrorSummary errors={errors} attempt={attempt} />
          <TextField label="Title" hint="So that it is found again: what, and with which set-up." {...field('title')} />
          <TextField label="Bench day" type="date" className="w-44!" {...field('heldOn')} />
          <SelectField label="Requirement" optional {...field('requirementId')}>
            <option value="">none</option>
            {requirements.data?.items.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}
          </SelectField>
          <TextField label="Impedance" unit="Ω" inputMode="decimal" className="figure w-28! text-end" {...field('impedanceOhm')} />
          <SelectField label="Floor margin" className="field w-28!" {...field('floorMarginDb')}>
            {['3', '6', '10'].map((margin) => <option key={margin} value={margin}>{margin} dB</option>)}
          </SelectField>
          <TextArea label="Notes" optional {...field('notes')} />
          <div className="flex gap-3"><Button kind="main" type="submit" disabled={saving}>{saving ? 'Opening …' : 'Open the session'}</Button><LinkButton to="/sessions">Not now</LinkButton></div>
        </form>
      </Passage>
    </>
  );
}
