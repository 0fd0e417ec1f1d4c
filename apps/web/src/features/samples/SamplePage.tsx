import { listSampleCurves } from '@leeside/contracts/samples';
import { getSample, type Sample } from '@leeside/contracts/samples';
import { formatNumber } from '@leeside/units/format-quantity';
import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { CurveList } from '../../components/CurveList';
import { EmptyState } from '../../components/EmptyState';
import { Moment } from '../../components/Moment';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { readerLocale } from '../../components/reader-locale';
import { StateMark } from '../../components/StateMark';

function Fact({ name, across = false, children }: { name: string; across?: boolean; children: ReactNode }) {
  return <div className={across ? 'col-span-full' : ''}><dt className="text-xs text-faded">{name}</dt><dd>{children}</dd></div>;
}

const sizeText = (sizeM: readonly number[]): string => `${sizeM.map((metres) => formatNumber(metres * 1000, 0, readerLocale())).join(' × ')}\u2009mm`;

function Facts({ sample, ofLab }: { sample: Sample; ofLab: boolean }) {
  return (
    <dl className="mb-10 grid max-w-3xl grid-cols-2 gap-4 desk:grid-cols-3">
      <Fact name="State"><StateMark state={sample.state} /></Fact>
      {sample.designName && <Fact name="Design">{sample.designName}</Fact>}
      {sample.lotCode && <Fact name="Lot"><span className="figure">{sample.lotCode}</span></Fact>}
      {ofLab && sample.clientName && <Fact name="Client">{sample.clientName}</Fact>}
      {sample.insideSizeM && <Fact name="Inside"><span className="figure">{sizeText(sample.insideSizeM)}</span></Fact>}
      <Fact name="Taken in"><Moment at={sample.createdAt} /></Fact>
      {ofLab && sample.notes && <Fact name="Notes" across><span className="whitespace-pre-line">{sample.notes}</span></Fact>}
    </dl>
  );
}

function SampleCurves({ sampleId }: { sampleId: string }) {
  const curves = useApiQuery(listSampleCurves, { params: { id: sampleId } });
  return (
    <Passage title="Curves" count={curves.data?.items.length}>
      <Answered query={curves} what="the curves">
        {({ items }) => items.length > 0 ? <CurveList curves={items} named="session" /> : <EmptyState title="Not measured yet">Bring an enclosed sweep of it into a session and name this sample there.</EmptyState>}
      </Answered>
    </Passage>
  );
}

export function SamplePage() {
  const { sampleId = '' } = useParams();
  const sample = useApiQuery(getSample, { params: { id: sampleId } });
  const ofLab = useMay('lab.read');
  return (
    <Answered query={sample} what="the sample">
      {(found) => (
        <>
          <PageHead title={found.code} folio={found.name} />
          <Facts sample={found} ofLab={ofLab} />
          {ofLab && <SampleCurves sampleId={found.id} />}
        </>
      )}
    </Answered>
  );
}
