import { getCurve, getCurveCsv, type Curve } from '@leeside/contracts/curves';
import { Link, useParams } from 'react-router-dom';
import { endpointUrl } from '../../api-client/endpoint-url';
import { useApiQuery } from '../../api-client/use-api-query';
import { Answered } from '../../components/Answered';
import { Attenuation, Frequency } from '../../components/Figure';
import { Day } from '../../components/Moment';
import { OutcomeMark } from '../../components/OutcomeMark';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { DoubtRemarks, Remarks } from '../../components/Remarks';
import { StateMark } from '../../components/StateMark';
import { Bands, Gaps, Inputs } from './CurveFacts';
import { CurveSheet } from './CurveSheet';

const pendingPollMs = 2_000;
const titleOf = (curve: Curve): string => [curve.sampleCode ?? 'Without a sample', curve.condition].filter(Boolean).join(', ');

function CurveHead({ curve }: { curve: Curve }) {
  const { lowest, requirementName } = curve;
  const csv = endpointUrl(getCurveCsv, { params: { id: curve.id } });
  return (
    <PageHead
      title={titleOf(curve)}
      folio={<><Day on={curve.heldOn} /> · <Link to={`/sessions/${curve.sessionId}`}>{curve.sessionTitle}</Link></>}
      action={curve.state === 'ready' && <a href={csv} download className="inline-flex min-h-10 items-center rounded-nib bg-copper px-4 text-sm font-semibold text-paper no-underline hover:bg-copper-deep">Download CSV</a>}
    >
      <p className="flex flex-wrap items-center gap-x-4 gap-y-1">
        {curve.state === 'ready' ? <OutcomeMark outcome={curve.outcome} large /> : <StateMark state={curve.state === 'failed' ? 'no curve yet' : curve.state} />}
        {requirementName && <span className="text-faded">{requirementName}</span>}
        {lowest && <span>Lowest <strong><Attenuation db={lowest.attenuationDb} atLeast={lowest.atLeast} /></strong> at <Frequency hz={lowest.frequencyHz} /></span>}
      </p>
    </PageHead>
  );
}

function Unready({ curve }: { curve: Curve }) {
  const words = curve.state === 'pending' ? 'It is being computed. This page fills itself when it is done.' : (curve.failure ?? 'It could not be computed.');
  return (
    <Passage title="No curve yet" remarks={<Remarks about="the curve"><DoubtRemarks doubts={curve.doubts} /></Remarks>}>
      <p role="status">{words}</p>
    </Passage>
  );
}

export function CurvePage() {
  const { curveId = '' } = useParams();
  const curve = useApiQuery(getCurve, { params: { id: curveId } }, { refetchInterval: (query) => (query.state.data?.state === 'pending' ? pendingPollMs : false) });
  return (
    <Answered query={curve} what="the curve">
      {(found) => (
        <>
          <CurveHead curve={found} />
          {found.state === 'ready' ? <CurveSheet key={found.revision} curve={found} /> : <Unready curve={found} />}
          <Bands bands={found.bands} />
          <Gaps gaps={found.gaps} />
          <Inputs curve={found} />
        </>
      )}
    </Answered>
  );
}
