import { getRequirement } from '@leeside/contracts/requirements';
import type { Curve } from '@leeside/contracts/curves';
import { useRef } from 'react';
import { useApiQuery } from '../../api-client/use-api-query';
import { useCurvePoints } from '../../components/attenuation-plot/use-curve-points';
import { ErrorState } from '../../components/ErrorState';
import { LoadingLines } from '../../components/LoadingLines';
import { Passage } from '../../components/Passage';
import { useWidth } from '../../components/plot/use-width';
import { CurvePlots } from './CurvePlots';
import { CurveRemarks, ThinnedRemark } from './CurveRemarks';
import { CurveTable } from './CurveTable';
import { useCurveView } from './use-curve-view';
import { usePlotCursor } from './use-plot-cursor';
import { wholeWindow } from './whole-window';

const nothing = { frequencyHz: [], attenuationDb: [], atLeast: [], atMostDb: [], ceilingDb: [], expandedUncertaintyDb: [], requiredDb: [] };

const noSegments: never[] = [];

function useSegments(requirementId: string | null) {
  const requirement = useApiQuery(getRequirement, { params: { id: requirementId ?? '' } }, { enabled: requirementId !== null, staleTime: Infinity });
  return requirement.data?.segments ?? noSegments;
}

/** Plot, readout and table of one curve: they share the points, the window and the cursor. */
export function CurveSheet({ curve }: { curve: Curve }) {
  const place = useRef<HTMLDivElement>(null);
  const width = useWidth(place);
  const view = useCurveView();
  const segments = useSegments(curve.requirementId);
  const overview = useCurvePoints(curve.id, null, width, curve.revision);
  const zoomed = useCurvePoints(curve.id, view.zoom, width, curve.revision);
  const points = zoomed.data ?? overview.data ?? nothing;
  const whole = wholeWindow(overview.data?.frequencyHz ?? []);
  const cursor = usePlotCursor(points, curve.lowest?.frequencyHz ?? 0);
  const ready = overview.data !== undefined && whole !== null && width > 0;
  const thinned = points.frequencyHz.length < curve.pointCount;
  return (
    <>
      <Passage title="Attenuation" remarks={<CurveRemarks curve={curve} />}>
        <div className="border border-rule bg-sheet p-3 desk:p-5">
          <div ref={place}>
            {ready && <CurvePlots curve={curve} points={points} segments={segments} whole={whole} view={view} cursor={cursor} width={width} />}
            {overview.isError && <ErrorState error={overview.error} what="The points could not be loaded" onRetry={() => void overview.refetch()} />}
            {!ready && !overview.isError && <LoadingLines what="the plot" lines={2} tall />}
          </div>
        </div>
      </Passage>
      <Passage title="In numbers" count={points.frequencyHz.length} remarks={thinned && <ThinnedRemark shown={points.frequencyHz.length} all={curve.pointCount} />}>
        {ready && <CurveTable points={points} cursorAt={cursor.at} onCursor={cursor.moveTo} rows={view.rows} onRows={view.setRows} />}
      </Passage>
    </>
  );
}
