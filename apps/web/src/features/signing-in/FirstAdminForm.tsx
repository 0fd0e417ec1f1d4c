import { createFirstAdmin, getMe } from '@leeside/contracts/authentication';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { z } from 'zod';
import { callApi } from '../../api-client/call-api';
import { csrfToken } from '../../api-client/csrf-token';
import { queryKeyOf } from '../../api-client/use-api-query';
import { Button } from '../../components/Button';
import { ErrorSummary } from '../../components/ErrorSummary';
import { TextField } from '../../components/Field';
import { useNotebookForm } from '../../components/form/use-notebook-form';

const schema = z.object({
  name: z.string().trim().min(1, 'Your name is missing.').max(200, 'Name is longer than 200 characters.'),
  email: z.email('This is no e-mail address.'),
  password: z.string().min(12, 'Password needs 12 characters or more.'),
});

/** The first person of an empty lab; the link with its token works once. */
export function FirstAdminForm() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const token = useSearchParams()[0].get('token');
  const { field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'first-admin', schema, empty: { name: '', email: '', password: '' }, keepsDraft: false,
    save: async (values) => {
      const signedIn = await callApi(createFirstAdmin, { body: { ...values, token: token ?? '' } });
      csrfToken.set(signedIn.csrfToken);
      client.setQueryData(queryKeyOf(getMe, {}), signedIn);
      await navigate('/', { replace: true });
    },
  });
  if (!token) return <p>This address lacks its token. Open the whole link that <code>start --empty</code> printed.</p>;
  return (
    <form onSubmit={submit} noValidate>
      <ErrorSummary errors={errors} attempt={attempt} />
      <p className="mb-5 text-sm text-faded">The lab is empty and nobody has an account. You become its admin; the link works this once.</p>
      <TextField label="Your name" autoComplete="name" {...field('name')} />
      <TextField label="E-mail address" type="email" autoComplete="username" {...field('email')} />
      <TextField label="Password" hint="12 characters or more; a few words do well." type="password" autoComplete="new-password" {...field('password')} />
      <Button kind="main" type="submit" disabled={saving}>{saving ? 'Opening …' : 'Open the lab'}</Button>
    </form>
  );
}
