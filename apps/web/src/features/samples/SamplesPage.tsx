import { listSamples, type Sample } from '@leeside/contracts/samples';
import { useState, type FormEvent } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { Button, LinkButton } from '../../components/Button';
import { EmptyState } from '../../components/EmptyState';
import { NoFigure } from '../../components/Figure';
import { Moment } from '../../components/Moment';
import { NextPage } from '../../components/NextPage';
import { PageHead } from '../../components/PageHead';
import { StateMark } from '../../components/StateMark';
import { Cell, HeadCell, Table } from '../../components/Table';
import { useCursor } from '../../components/use-cursor';

function SampleRow({ sample, ofLab }: { sample: Sample; ofLab: boolean }) {
  return (
    <tr>
      <Cell><Link to={`/samples/${sample.id}`} className="figure font-semibold">{sample.code}</Link></Cell>
      <Cell>{sample.name}</Cell>
      <Cell><StateMark state={sample.state} /></Cell>
      <Cell>{sample.lotCode ?? <NoFigure why="no lot" />}</Cell>
      {ofLab && <Cell>{sample.clientName ?? <NoFigure why="no client" />}</Cell>}
      <Cell><Moment at={sample.createdAt} /></Cell>
    </tr>
  );
}

function FindByCode() {
  const [search, setSearch] = useSearchParams();
  const [code, setCode] = useState(search.get('code') ?? '');
  const find = (event: FormEvent): void => {
    event.preventDefault();
    setSearch(code.trim() ? { code: code.trim() } : {});
  };
  return (
    <form role="search" onSubmit={find} className="mb-5 flex max-w-md items-end gap-2">
      <label className="flex-1 text-sm font-semibold">Code<input className="field mt-0.5 font-normal" value={code} onChange={(event) => setCode(event.target.value)} /></label>
      <Button type="submit">Find</Button>
      {search.get('code') && <LinkButton kind="quiet" to="/samples" onClick={() => setCode('')}>All</LinkButton>}
    </form>
  );
}

export function SamplesPage() {
  const code = useSearchParams()[0].get('code');
  const samples = useApiQuery(listSamples, { query: { ...useCursor(), ...(code ? { code } : {}) } });
  const mayTakeIn = useMay('intake.edit');
  const ofLab = useMay('lab.read');
  return (
    <>
      <PageHead broad title={ofLab ? 'Samples' : 'Your samples'} folio="The newest first" action={mayTakeIn && <LinkButton kind="main" to="/samples/new">Take a sample in</LinkButton>} />
      {ofLab && <FindByCode />}
      <Answered query={samples} what="the samples">
        {({ items, next }) => items.length === 0
          ? code ? <EmptyState title={`No sample with the code ${code}`} /> : <EmptyState title={ofLab ? 'No sample yet' : 'The lab holds no sample of yours yet'} action={mayTakeIn && <LinkButton to="/samples/new">Take the first sample in</LinkButton>}>{ofLab && 'A sample is one pouch, bag or box with its own code, so that every curve is known to be of it.'}</EmptyState>
          : (
            <>
              <Table caption="Samples">
                <thead><tr><HeadCell>Code</HeadCell><HeadCell>Name</HeadCell><HeadCell>State</HeadCell><HeadCell>Lot</HeadCell>{ofLab && <HeadCell>Client</HeadCell>}<HeadCell>Taken in</HeadCell></tr></thead>
                <tbody>{items.map((sample) => <SampleRow key={sample.id} sample={sample} ofLab={ofLab} />)}</tbody>
              </Table>
              <NextPage next={next} />
            </>
          )}
      </Answered>
    </>
  );
}
