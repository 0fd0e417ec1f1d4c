import type { Endpoint } from '@leeside/contracts/endpoint';
import { useQuery, type UseQueryOptions, type UseQueryResult } from '@tanstack/react-query';
import { callApi } from './call-api';
import type { EndpointAnswer, EndpointInput } from './endpoint-input';

type Options<Answer> = Omit<UseQueryOptions<Answer>, 'queryKey' | 'queryFn'>;

export const queryKeyOf = <E extends Endpoint>(endpoint: E, input?: EndpointInput<E>): readonly unknown[] =>
  input === undefined ? [endpoint.name] : [endpoint.name, input];

/** A GET of the API, kept by the query cache under the endpoint's name and its input. */
export function useApiQuery<E extends Endpoint>(endpoint: E, input: EndpointInput<E>, options: Options<EndpointAnswer<E>> = {}): UseQueryResult<EndpointAnswer<E>> {
  return useQuery({
    queryKey: queryKeyOf(endpoint, input),
    queryFn: ({ signal }) => callApi(endpoint, input, signal),
    ...options,
  });
}
