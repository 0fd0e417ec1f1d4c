import { getSession, type Session } from '@leeside/contracts/sessions';
import { formatNumber } from '@leeside/units/format-quantity';
import { Link, useParams } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { Answered } from '../../components/Answered';
import { Day } from '../../components/Moment';
import { PageHead } from '../../components/PageHead';
import { readerLocale } from '../../components/reader-locale';
import { Levels } from './levels/Levels';
import { SessionCurves } from './SessionCurves';
import { Traces } from './traces/Traces';
import { isSettled } from './tray/progress-in-words';
import { Tray } from './tray/Tray';
import { useLiveSession } from './use-live-session';

const unsettledPollMs = 4_000;

const parts = [['#tray', 'Tray'], ['#traces', 'Traces'], ['#levels', 'Typed levels'], ['#curves', 'Curves']] as const;

function SessionHead({ session }: { session: Session }) {
  return (
    <PageHead title={session.title} folio={<>Session of <Day on={session.heldOn} />, held by {session.createdByName}</>}>
      <p className="text-sm text-faded">
        {session.requirementId && session.requirementName ? <>Against <Link to={`/requirements/${session.requirementId}`}>{session.requirementName}</Link></> : 'Against no requirement'}
        {' · '}<span className="figure">{formatNumber(session.impedanceOhm, 0, readerLocale())}{'\u2009'}Ω</span>
        {' · '}floor margin <span className="figure">{formatNumber(session.floorMarginDb, 0, readerLocale())}{'\u2009'}dB</span>
      </p>
      {session.notes && <p className="mt-2 max-w-prose text-sm whitespace-pre-line">{session.notes}</p>}
      <nav aria-label="On this page" className="not-printed mt-3 flex flex-wrap gap-x-4 text-sm">
        {parts.map(([to, word]) => <a key={to} href={to}>{word}</a>)}
      </nav>
    </PageHead>
  );
}

export function SessionPage() {
  const { sessionId = '' } = useParams();
  useLiveSession(sessionId);
  const session = useApiQuery(getSession, { params: { id: sessionId } }, {
    refetchInterval: (query) => (query.state.data && !isSettled(query.state.data.progress) ? unsettledPollMs : false),
  });
  return (
    <Answered query={session} what="the session">
      {(found) => (
        <>
          <SessionHead session={found} />
          <Tray session={found} />
          <Traces sessionId={found.id} />
          <Levels sessionId={found.id} />
          <SessionCurves sessionId={found.id} />
        </>
      )}
    </Answered>
  );
}
