import { listSamples } from '@leeside/contracts/samples';
import type { ComponentProps } from 'react';
import { useApiQuery } from '../api-client/use-api-query';

type SampleSelectProps = ComponentProps<'select'> & { none: string };

/** The samples of the lab by code; the first choice is none of them. */
export function SampleSelect({ none, className = 'field', ...rest }: SampleSelectProps) {
  const samples = useApiQuery(listSamples, { query: { limit: 200 } }, { staleTime: 60_000 });
  return (
    <select className={className} {...rest}>
      <option value="">{none}</option>
      {samples.data?.items.map((sample) => <option key={sample.id} value={sample.id}>{sample.code} · {sample.name}</option>)}
    </select>
  );
}
