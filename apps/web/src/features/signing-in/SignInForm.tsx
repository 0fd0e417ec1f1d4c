import { getMe, signIn } from '@leeside/contracts/authentication';
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
import { placeAfterSignIn } from './place-after-sign-in';

const schema = z.object({
  email: z.string().trim().min(1, 'Your e-mail address is missing.'),
  password: z.string().min(1, 'Your password is missing.'),
});

export function SignInForm() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'sign-in', schema, empty: { email: '', password: '' }, keepsDraft: false,
    save: async (body) => {
      const signedIn = await callApi(signIn, { body });
      client.clear();
      csrfToken.set(signedIn.csrfToken);
      client.setQueryData(queryKeyOf(getMe, {}), signedIn);
      await navigate(placeAfterSignIn(search.get('then'), signedIn.user.roles), { replace: true });
    },
  });
  return (
    <form onSubmit={submit} noValidate>
      <ErrorSummary errors={errors} attempt={attempt} />
      <TextField label="E-mail address" type="email" autoComplete="username" {...field('email')} />
      <TextField label="Password" type="password" autoComplete="current-password" {...field('password')} />
      <Button kind="main" type="submit" disabled={saving}>{saving ? 'Signing in …' : 'Sign in'}</Button>
    </form>
  );
}
