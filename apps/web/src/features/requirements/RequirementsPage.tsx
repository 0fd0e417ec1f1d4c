import { listRequirements, type Requirement } from '@leeside/contracts/requirements';
import { Link } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { LinkButton } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { FrequencyRange, Level } from '../../components/Figure';
import { NextPage } from '../../components/NextPage';
import { PageHead } from '../../components/PageHead';
import { Cell, HeadCell, Table } from '../../components/Table';
import { useCursor } from '../../components/use-cursor';

function RequirementRow({ requirement }: { requirement: Requirement }) {
  const { segments } = requirement;
  const decibels = segments.flatMap(({ fromDb, toDb }) => [fromDb, toDb]);
  const least = Math.min(...decibels);
  const most = Math.max(...decibels);
  return (
    <tr>
      <Cell><Link to={`/requirements/${requirement.id}`} className="font-semibold">{requirement.name}</Link></Cell>
      <Cell>{requirement.rule}</Cell>
      <Cell figure><FrequencyRange fromHz={segments[0]?.fromHz ?? 0} toHz={segments.at(-1)?.toHz ?? 0} /></Cell>
      <Cell figure><Level level={least} unit="dB" decimals={0} />{most > least && <> to <Level level={most} unit="dB" decimals={0} /></>}</Cell>
    </tr>
  );
}

export function RequirementsPage() {
  const requirements = useApiQuery(listRequirements, { query: useCursor() });
  const mayEdit = useMay('requirement.edit');
  return (
    <>
      <PageHead broad title="Requirements" folio="What attenuation is asked for, and how it is decided" action={mayEdit && <LinkButton kind="main" to="/requirements/new">State a requirement</LinkButton>} />
      <Answered query={requirements} what="the requirements">
        {({ items, next }) => items.length === 0
          ? <EmptyState title="No requirement yet" action={mayEdit && <LinkButton to="/requirements/new">State the first one</LinkButton>}>Without one a curve has no outcome, only numbers.</EmptyState>
          : (
            <>
              <Table caption="Requirements">
                <thead><tr><HeadCell>Name</HeadCell><HeadCell>Decision rule</HeadCell><HeadCell figure>Covers</HeadCell><HeadCell figure>At least</HeadCell></tr></thead>
                <tbody>{items.map((requirement) => <RequirementRow key={requirement.id} requirement={requirement} />)}</tbody>
              </Table>
              <NextPage next={next} />
            </>
          )}
      </Answered>
    </>
  );
}
