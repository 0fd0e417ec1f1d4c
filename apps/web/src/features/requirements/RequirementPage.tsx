import { getRequirement, type Requirement } from '@leeside/contracts/requirements';
import { formatNumber } from '@leeside/units/format-quantity';
import { useParams } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { Answered } from '../../components/Answered';
import { Frequency, Level } from '../../components/Figure';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { readerLocale } from '../../components/reader-locale';
import { Cell, HeadCell, Table } from '../../components/Table';
import { RuleRemarks } from './RuleRemarks';

function Rule({ requirement }: { requirement: Requirement }) {
  const guard = formatNumber(requirement.guardFactor, 2, readerLocale());
  return (
    <p>
      Decided by the <strong>{requirement.rule}</strong> rule{requirement.rule === 'guarded' && <>, with a guard band of <span className="figure">{guard}</span> times the expanded uncertainty</>}.
      One reading at f stands for f/<span className="figure">{formatNumber(requirement.standsForRatio, 2, readerLocale())}</span> to f·<span className="figure">{formatNumber(requirement.standsForRatio, 2, readerLocale())}</span>.
    </p>
  );
}

export function RequirementPage() {
  const { requirementId = '' } = useParams();
  const requirement = useApiQuery(getRequirement, { params: { id: requirementId } });
  return (
    <Answered query={requirement} what="the requirement">
      {(found) => (
        <>
          <PageHead title={found.name} folio="Requirement"><Rule requirement={found} /></PageHead>
          <Passage title="Segments" count={found.segments.length} remarks={<RuleRemarks />}>
            <Table caption="Segments">
              <thead><tr><HeadCell figure>From</HeadCell><HeadCell figure>To</HeadCell><HeadCell figure>At least, at the lower end</HeadCell><HeadCell figure>At least, at the upper end</HeadCell></tr></thead>
              <tbody>
                {found.segments.map((segment) => (
                  <tr key={segment.fromHz}>
                    <Cell figure><Frequency hz={segment.fromHz} /></Cell><Cell figure><Frequency hz={segment.toHz} /></Cell>
                    <Cell figure><Level level={segment.fromDb} unit="dB" /></Cell><Cell figure><Level level={segment.toDb} unit="dB" /></Cell>
                  </tr>
                ))}
              </tbody>
            </Table>
          </Passage>
        </>
      )}
    </Answered>
  );
}
