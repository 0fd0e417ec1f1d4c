import { createToken, listTokens } from '@leeside/contracts/authentication';
import { useState } from 'react';
import { z } from 'zod';
import { useApiChange } from '../../api-client/use-api-change';
import { Button } from '../../components/Button';
import { ErrorSummary } from '../../components/ErrorSummary';
import { SelectField, TextField } from '../../components/Field';
import { useNotebookForm } from '../../components/form/use-notebook-form';

type May = 'both' | 'read';
const empty: { name: string; may: May } = { name: '', may: 'both' };
const schema = z.object({
  name: z.string().trim().min(1, 'Name is missing. Say what will use it.').max(200, 'Name is longer than 200 characters.'),
  may: z.enum(['both', 'read']),
});

function OnceShown({ token, onDone }: { token: string; onDone: () => void }) {
  const [copied, setCopied] = useState(false);
  const copy = (): void => void navigator.clipboard.writeText(token).then(() => setCopied(true), () => setCopied(false));
  return (
    <div role="status" className="mb-6 max-w-xl border-2 border-patina bg-sheet p-4">
      <p className="font-semibold">Here it is, this once. Put it where it belongs now.</p>
      <code className="my-3 block border border-rule bg-paper p-2 break-all select-all">{token}</code>
      <div className="flex items-center gap-3"><Button onClick={copy}>{copied ? 'Copied' : 'Copy'}</Button><Button kind="quiet" onClick={onDone}>I have it</Button></div>
    </div>
  );
}

export function NewToken() {
  const [token, setToken] = useState<string | null>(null);
  const create = useApiChange(createToken, [listTokens]);
  const { form, field, errors, attempt, saving, submit } = useNotebookForm({
    id: 'new-token', schema, empty,
    save: async ({ name, may }) => {
      const made = await create.mutateAsync({ body: { name, scopes: may === 'read' ? ['read'] : ['read', 'write'] } });
      setToken(made.token);
      form.reset(empty);
    },
  });
  if (token) return <OnceShown token={token} onDone={() => setToken(null)} />;
  return (
    <form onSubmit={submit} noValidate>
      <ErrorSummary errors={errors} attempt={attempt} />
      <TextField label="Name" hint="What will use it, for example: bench laptop 2." {...field('name')} />
      <SelectField label="It may" {...field('may')}><option value="both">read and write</option><option value="read">read</option></SelectField>
      <Button kind="main" type="submit" disabled={saving}>{saving ? 'Making …' : 'Make the token'}</Button>
    </form>
  );
}
