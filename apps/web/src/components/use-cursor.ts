import { useSearchParams } from 'react-router-dom';

/** The page of a list that the address asks for, as the query of the call. */
export function useCursor(): { cursor?: string } {
  const cursor = useSearchParams()[0].get('cursor');
  return cursor ? { cursor } : {};
}
