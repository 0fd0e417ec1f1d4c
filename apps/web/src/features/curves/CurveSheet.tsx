import { getRequirement } from '@leeside/contracts/requirements';
import type { Curve } from '@leeside/contracts/curves';
import { useMemo, useRef } from 'react';
import { useApiQuery } from '../../api-client/use-api-query';
import { useCurvePoints } from '../../components/attenuation-plot/use-curve-points';
import { Answered } from '../../components/Answered';
import { LoadingLines } from '../../components/LoadingLines';
import { Passage } from '../../components/Passage';
import { useWidth } from '../../components/plot/use-width';
import { CurvePlots } from './CurvePlots';
import { CurveRemarks, ThinnedRemark } from './CurveRemarks';
import { CurveTable } from './CurveTable';
import { pointsWithin } from './points-within';
import { useCurveView } from './use-curve-view';
import { usePlotCursor } from './use-plot-cursor';
import { wholeWindow } from './whole-window';

const nothing = { frequencyHz: [], attenuationDb: [], atLeast: [], atMostDb: [], ceilingDb: [], expandedUncertaintyDb: [], requiredDb: [] };

const noSegments: never[] = [];
const everything = { fromHz: 0, toHz: Infinity };

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
  const whole = useMemo(() => wholeWindow(overview.data?.frequencyHz ?? []), [overview.data]);
  const { fromHz, toHz } = view.zoom ?? everything;
  const inside = useMemo(() => pointsWithin(points, { fromHz, toHz }), [points, fromHz, toHz]);
  const cursor = usePlotCursor(inside, curve.lowest?.frequencyHz ?? 0);
  const shown = inside.frequencyHz.length;
  return (
    <>
      <Passage title="Attenuation" remarks={<CurveRemarks curve={curve} />}>
        <div className="border border-rule bg-sheet p-3 desk:p-5">
          <div ref={place}>
            <Answered query={overview} what="the points" loading={<LoadingLines what="the plot" lines={2} tall />}>
              {() => whole && <CurvePlots curve={curve} points={points} segments={segments} whole={whole} view={view} cursor={cursor} width={width} />}
            </Answered>
          </div>
        </div>
      </Passage>
      <Passage title="In numbers" count={shown} remarks={shown < curve.pointCount && <ThinnedRemark shown={shown} all={curve.pointCount} />}>
        {whole && <CurveTable points={inside} cursorAt={cursor.at} onCursor={cursor.moveTo} rows={view.rows} onRows={view.setRows} />}
      </Passage>
    </>
  );
}
