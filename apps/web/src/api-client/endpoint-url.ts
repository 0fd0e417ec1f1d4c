import type { Endpoint } from '@leeside/contracts/endpoint';
import type { LooseInput } from './endpoint-input';

export const apiBase = '/api/v1';

/** The address of a call: braces filled, query appended, absent values left out. */
export function endpointUrl(endpoint: Endpoint, { params = {}, query = {} }: LooseInput): string {
  const path = endpoint.path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean') search.set(name, String(value));
  }
  const text = search.toString();
  return `${apiBase}${path}${text ? `?${text}` : ''}`;
}
