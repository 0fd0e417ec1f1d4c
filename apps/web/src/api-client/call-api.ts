import type { Endpoint } from '@leeside/contracts/endpoint';
import { ApiProblem, nothingCameBack, problemFrom } from './api-problem';
import { csrfToken } from './csrf-token';
import type { EndpointAnswer, EndpointInput, LooseInput } from './endpoint-input';
import { endpointUrl } from './endpoint-url';
import { renewSession, tokenWasRenewed } from './renew-session';
import { signedOut } from './signed-out';

const send = async (endpoint: Endpoint, input: LooseInput, signal?: AbortSignal): Promise<Response> => {
  const headers = new Headers({ Accept: 'application/json' });
  const token = csrfToken.get();
  if (endpoint.method !== 'get' && token) headers.set('X-CSRF-Token', token);
  if (input.body !== undefined) headers.set('Content-Type', 'application/json');
  try {
    return await fetch(endpointUrl(endpoint, input), {
      method: endpoint.method.toUpperCase(), headers,
      ...(input.body === undefined ? {} : { body: JSON.stringify(input.body) }),
      ...(signal ? { signal } : {}),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw nothingCameBack();
  }
};

/** Sends, and once more after the session was renewed or another tab's token was fetched. */
const sendWithRenewal = async (endpoint: Endpoint, input: LooseInput, signal?: AbortSignal): Promise<Response> => {
  const first = await send(endpoint, input, signal);
  if (endpoint.access === 'public') return first;
  if (first.status === 401) {
    if (await renewSession()) return send(endpoint, input, signal);
    signedOut.announce();
  } else if (first.status === 403 && endpoint.method !== 'get' && (await tokenWasRenewed())) {
    return send(endpoint, input, signal);
  }
  return first;
};

/** One call of the API: sends, renews the session once where needed, and checks the answer against its contract. */
export async function callApi<E extends Endpoint>(endpoint: E, input: EndpointInput<E>, signal?: AbortSignal): Promise<EndpointAnswer<E>> {
  const response = await sendWithRenewal(endpoint, input as LooseInput, signal);
  const schema = endpoint.answers[response.status];
  if (schema === undefined) throw problemFrom(response.status, await response.text());
  if (schema === null) return null as EndpointAnswer<E>;
  const parsed = schema.safeParse(await response.json());
  if (!parsed.success) {
    throw new ApiProblem(response.status, 'The answer was not understood', `${endpoint.name}: ${parsed.error.issues[0]?.message ?? ''} at /${parsed.error.issues[0]?.path.join('/') ?? ''}`);
  }
  return parsed.data as EndpointAnswer<E>;
}
