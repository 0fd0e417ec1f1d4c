import type { Endpoint } from '@leeside/contracts/endpoint';
import { useMutation, useQueryClient, type UseMutationResult } from '@tanstack/react-query';
import { callApi } from './call-api';
import type { EndpointAnswer, EndpointInput } from './endpoint-input';

/** A call that changes something, and the endpoints whose kept answers are asked for again afterwards. */
export function useApiChange<E extends Endpoint>(endpoint: E, stale: readonly Endpoint[] = []): UseMutationResult<EndpointAnswer<E>, Error, EndpointInput<E>> {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: EndpointInput<E>) => callApi(endpoint, input),
    onSuccess: async () => {
      await Promise.all(stale.map((other) => client.invalidateQueries({ queryKey: [other.name] })));
    },
  });
}
