import { getToday, type Today } from '@leeside/contracts/today';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay, useSignedIn } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { LinkButton } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { Day } from '../../components/Moment';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { Remark, Remarks } from '../../components/Remarks';
import { waitingCount } from './waiting-count';

interface LineProps { to: string; what: ReactNode; where: ReactNode; why?: ReactNode }

function Line({ to, what, where, why }: LineProps) {
  return (
    <li className="grid gap-x-5 gap-y-0.5 border-b border-rule py-2.5 desk:grid-cols-[minmax(0,1.1fr)_minmax(0,1fr)]">
      <span><Link to={to} className="font-semibold wrap-anywhere">{what}</Link><span className="block text-sm text-faded">{where}</span></span>
      {why && <span className="text-sm">{why}</span>}
    </li>
  );
}

function Waiting({ title, count, remark, children }: { title: string; count: number; remark?: ReactNode; children: ReactNode }) {
  if (count === 0) return null;
  return (
    <Passage title={title} count={count} remarks={remark && <Remarks about={title}><Remark>{remark}</Remark></Remarks>}>
      <ul className="list-none">{children}</ul>
    </Passage>
  );
}

function Files({ today }: { today: Today }) {
  return (
    <>
      <Waiting title="Files that ask something" count={today.filesNeedingAnswer.length} remark="One click answers each; the file is read on at once.">
        {today.filesNeedingAnswer.map((file) => <Line key={file.fileId} to={`/files/${file.fileId}`} what={file.name} where={file.sessionTitle} why={file.reason} />)}
      </Waiting>
      <Waiting title="Files refused" count={today.filesRefused.length} remark="The bytes are kept. Each says what was found and where.">
        {today.filesRefused.map((file) => <Line key={file.fileId} to={`/files/${file.fileId}`} what={file.name} where={file.sessionTitle} why={file.reason} />)}
      </Waiting>
    </>
  );
}

function Measurements({ today }: { today: Today }) {
  return (
    <>
      <Waiting title="Guesses to confirm" count={today.guessedTraces.length} remark="What a sweep is was guessed from the name of its file.">
        {today.guessedTraces.map((guess) => <Line key={guess.sessionId} to={`/sessions/${guess.sessionId}#traces`} what={guess.sessionTitle} where={`${String(guess.count)} ${guess.count === 1 ? 'trace' : 'traces'}`} />)}
      </Waiting>
      <Waiting title="Curves in doubt" count={today.curvesInDoubt.length}>
        {today.curvesInDoubt.map((curve) => <Line key={curve.curveId} to={`/curves/${curve.curveId}`} what={curve.sampleCode ?? 'Without a sample'} where={curve.sessionTitle} why={curve.doubt} />)}
      </Waiting>
      <Waiting title="Samples on the bench" count={today.samplesOnTheBench.length}>
        {today.samplesOnTheBench.map((sample) => <Line key={sample.id} to={`/samples/${sample.id}`} what={sample.code} where={sample.name} />)}
      </Waiting>
    </>
  );
}

function Recent({ today, mayHold }: { today: Today; mayHold: boolean }) {
  return (
    <Passage title="Last at the bench" count={today.recentSessions.length}>
      {today.recentSessions.length === 0
        ? <EmptyState title="No session yet" action={mayHold && <LinkButton to="/sessions/new">Open the first session</LinkButton>}>A session holds one stretch at the bench: its reference, its enclosed sweeps, its noise.</EmptyState>
        : <ul className="list-none">{today.recentSessions.map((session) => <Line key={session.id} to={`/sessions/${session.id}`} what={session.title} where={<Day on={session.heldOn} />} />)}</ul>}
    </Passage>
  );
}

/** What waits for the person who looks. */
export function TodayPage() {
  const user = useSignedIn();
  const mayHold = useMay('session.edit');
  const mayRead = useMay('lab.read');
  const today = useApiQuery(getToday, {}, { refetchOnWindowFocus: true, enabled: mayRead });
  if (!mayRead) return <><PageHead title="Today" /><p>Your samples stand <Link to="/samples">on a page of their own</Link>.</p></>;
  return (
    <>
      <PageHead title="Today" folio={user.labName} action={mayHold && <LinkButton kind="main" to="/sessions/new">New session</LinkButton>} />
      <Answered query={today} what="what waits for you">
        {(found) => (
          <>
            {waitingCount(found) === 0 && <p className="mb-8 border-s-4 border-patina ps-4 text-lg">Nothing waits for you, {user.name}.</p>}
            <Files today={found} />
            <Measurements today={found} />
            <Recent today={found} mayHold={mayHold} />
          </>
        )}
      </Answered>
    </>
  );
}
