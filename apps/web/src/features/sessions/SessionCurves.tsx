import { listCurves } from '@leeside/contracts/curves';
import { useApiQuery } from '../../api-client/use-api-query';
import { Answered } from '../../components/Answered';
import { CurveList } from '../../components/CurveList';
import { EmptyState } from '../../components/EmptyState';
import { Passage } from '../../components/Passage';
import { Remark, Remarks } from '../../components/Remarks';

export function SessionCurves({ sessionId }: { sessionId: string }) {
  const query = useApiQuery(listCurves, { params: { id: sessionId } });
  const hasBounds = query.data?.items.some(({ lowest }) => lowest?.atLeast) ?? false;
  const remarks = (
    <Remarks about="the curves">
      <Remark>One curve for each sample and condition: repeats, positions and polarisations fold into it, the worst at each frequency.</Remark>
      {hasBounds && <Remark>≥ marks a bound: the enclosed level could not be told from the noise, the true attenuation is this much or more.</Remark>}
    </Remarks>
  );
  return (
    <Passage id="curves" title="Curves" count={query.data?.items.length} remarks={remarks}>
      <Answered query={query} what="the curves">
        {({ items }) => items.length > 0
          ? <CurveList curves={items} named="sample" />
          : <EmptyState title="No curve yet">A curve needs a reference in the open and an enclosed sweep or level. A noise sweep with the generator off gives it its ceiling.</EmptyState>}
      </Answered>
    </Passage>
  );
}
