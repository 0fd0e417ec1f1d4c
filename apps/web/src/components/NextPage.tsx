import { useSearchParams } from 'react-router-dom';
import { LinkButton } from './Button';

/** Pages of a list stand in the address: Back goes to the page before. */
export function NextPage({ next }: { next: string | null }) {
  const [search] = useSearchParams();
  const cursor = search.get('cursor');
  if (!next && !cursor) return null;
  const following = new URLSearchParams(search);
  if (next) following.set('cursor', next);
  const first = new URLSearchParams(search);
  first.delete('cursor');
  return (
    <p className="mt-4 flex gap-3">
      {cursor && <LinkButton to={`?${first.toString()}`}>First page</LinkButton>}
      {next && <LinkButton to={`?${following.toString()}`}>Next page</LinkButton>}
    </p>
  );
}
