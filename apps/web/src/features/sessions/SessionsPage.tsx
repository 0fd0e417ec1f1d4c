import { listSessions, type SessionSummary } from '@leeside/contracts/sessions';
import { Link } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { LinkButton } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { Day } from '../../components/Moment';
import { NextPage } from '../../components/NextPage';
import { PageHead } from '../../components/PageHead';
import { Cell, HeadCell, Table } from '../../components/Table';
import { useCursor } from '../../components/use-cursor';
import { progressInWords } from './tray/progress-in-words';

function SessionRow({ session }: { session: SessionSummary }) {
  return (
    <tr>
      <Cell><Day on={session.heldOn} /></Cell>
      <Cell><Link to={`/sessions/${session.id}`} className="font-semibold">{session.title}</Link></Cell>
      <Cell>{session.requirementName ?? <span className="text-faded">no requirement</span>}</Cell>
      <Cell>{progressInWords(session.progress, 0) || <span className="text-faded">no file yet</span>}</Cell>
      <Cell>{session.createdByName}</Cell>
    </tr>
  );
}

export function SessionsPage() {
  const sessions = useApiQuery(listSessions, { query: useCursor() });
  const mayHold = useMay('session.edit');
  const open = mayHold && <LinkButton kind="main" to="/sessions/new">New session</LinkButton>;
  return (
    <>
      <PageHead broad title="Sessions" folio="The latest bench day first" action={open} />
      <Answered query={sessions} what="the sessions">
        {({ items, next }) => items.length === 0
          ? <EmptyState title="No session yet" action={mayHold && <LinkButton to="/sessions/new">Open the first session</LinkButton>}>A session holds one stretch at the bench: its reference, its enclosed sweeps, its noise. Open one, then drop the sweeps of the day into its tray.</EmptyState>
          : (
            <>
              <Table caption="Sessions">
                <thead><tr><HeadCell>Held on</HeadCell><HeadCell>Session</HeadCell><HeadCell>Against</HeadCell><HeadCell>How far</HeadCell><HeadCell>By</HeadCell></tr></thead>
                <tbody>{items.map((session) => <SessionRow key={session.id} session={session} />)}</tbody>
              </Table>
              <NextPage next={next} />
            </>
          )}
      </Answered>
    </>
  );
}
