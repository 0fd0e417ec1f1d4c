import { listTokens, revokeToken } from '@leeside/contracts/authentication';
import { useState } from 'react';
import { useApiChange } from '../../api-client/use-api-change';
import { useApiQuery } from '../../api-client/use-api-query';
import { Answered } from '../../components/Answered';
import { Button } from '../../components/Button';
import { Dialog } from '../../components/Dialog';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { NoFigure } from '../../components/Figure';
import { Moment } from '../../components/Moment';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { Remark, Remarks } from '../../components/Remarks';
import { Cell, HeadCell, Table } from '../../components/Table';
import { NewToken } from './NewToken';

const remarks = (
  <Remarks about="API tokens">
    <Remark>A token lets a script or a bench laptop act for you, never beyond your own roles. Send it as <code>Authorization: Bearer …</code></Remark>
    <Remark>Only its fingerprint is kept here: it is shown once, when it is made.</Remark>
  </Remarks>
);

interface Token { id: string; name: string; scopes: readonly string[]; createdAt: string; lastUsedAt: string | null }

function TokenTable({ tokens }: { tokens: readonly Token[] }) {
  const [leaving, setLeaving] = useState<Token | null>(null);
  const revoke = useApiChange(revokeToken, [listTokens]);
  return (
    <>
      <Table caption="Your tokens">
        <thead><tr><HeadCell>Name</HeadCell><HeadCell>May</HeadCell><HeadCell>Made</HeadCell><HeadCell>Last used</HeadCell><HeadCell><span className="sr-only">Act</span></HeadCell></tr></thead>
        <tbody>
          {tokens.map((token) => (
            <tr key={token.id}>
              <Cell className="font-semibold">{token.name}</Cell><Cell>{token.scopes.join(' and ')}</Cell><Cell><Moment at={token.createdAt} /></Cell>
              <Cell>{token.lastUsedAt ? <Moment at={token.lastUsedAt} /> : <NoFigure why="never" />}</Cell>
              <Cell figure><Button kind="quiet" className="min-h-6!" onClick={() => setLeaving(token)}>Revoke<span className="sr-only"> {token.name}</span></Button></Cell>
            </tr>
          ))}
        </tbody>
      </Table>
      {revoke.isError && <ErrorState error={revoke.error} what="The token was not revoked" kept="It still works." />}
      {leaving && (
        <Dialog title={`Revoke ${leaving.name}`} onClose={() => setLeaving(null)} confirm={{ word: `Revoke ${leaving.name}`, grave: true, onConfirm: () => { revoke.mutate({ params: { id: leaving.id } }); setLeaving(null); } }}>
          <p>Whatever uses it is refused from the next request on. This cannot be undone.</p>
        </Dialog>
      )}
    </>
  );
}

export function TokensPage() {
  const tokens = useApiQuery(listTokens, {});
  return (
    <>
      <PageHead title="Tokens" folio="For scripts and bench laptops that act for you" />
      <Passage title="Make one" remarks={remarks}><NewToken /></Passage>
      <Passage title="Yours" count={tokens.data?.items.length}>
        <Answered query={tokens} what="your tokens">
          {({ items }) => items.length > 0 ? <TokenTable tokens={items} /> : <EmptyState title="None made yet">Make one above when a script is to upload or to read for you.</EmptyState>}
        </Answered>
      </Passage>
    </>
  );
}
