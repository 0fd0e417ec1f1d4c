import type { Endpoint } from '@leeside/contracts/endpoint';
import { uploadFieldSchemas } from '@leeside/contracts/files';
import { problemSchema } from '@leeside/contracts/problem';
import { z } from 'zod';

type Json = Record<string, unknown>;

const toJson = (schema: z.ZodType, io: 'input' | 'output'): Json => {
  const { $schema: _dialect, ...json } = z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' }) as Json;
  return json;
};

function parametersOf(schema: z.ZodType | undefined, place: 'path' | 'query'): Json[] {
  if (schema === undefined) return [];
  const { properties = {}, required = [] } = toJson(schema, 'input') as { properties?: Json; required?: string[] };
  return Object.entries(properties).map(([name, json]) => ({ name, in: place, required: place === 'path' || required.includes(name), schema: json }));
}

function multipartBody(): Json {
  const fields = Object.fromEntries(Object.entries(uploadFieldSchemas).map(([name, schema]) => [name, toJson(schema, 'input')]));
  return { type: 'object', description: 'A field describes the files after it until it is repeated; an empty one clears it.', properties: { ...fields, file: { type: 'array', items: { type: 'string', contentMediaType: 'application/octet-stream' } } }, required: ['file'] };
}

function requestBodyOf(endpoint: Endpoint): Json | undefined {
  if (endpoint.multipart) return { required: true, content: { 'multipart/form-data': { schema: multipartBody() } } };
  return endpoint.body === undefined ? undefined : { required: true, content: { 'application/json': { schema: toJson(endpoint.body, 'input') } } };
}

function responsesOf(endpoint: Endpoint): Json {
  const good = Object.entries(endpoint.answers).map(([status, schema]) => {
    const content = schema === null ? (endpoint.answerType === undefined ? undefined : { [endpoint.answerType]: {} }) : { 'application/json': { schema: toJson(schema, 'output') } };
    return [status, { description: endpoint.summary, ...(content === undefined ? {} : { content }) }] as const;
  });
  return { ...Object.fromEntries(good), default: { description: 'A refusal', content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } } };
}

function operationOf(endpoint: Endpoint): Json {
  const parameters = [...parametersOf(endpoint.params, 'path'), ...parametersOf(endpoint.query, 'query')];
  const requestBody = requestBodyOf(endpoint);
  return {
    operationId: endpoint.name, summary: endpoint.summary, ...(parameters.length > 0 ? { parameters } : {}), ...(requestBody === undefined ? {} : { requestBody }), responses: responsesOf(endpoint),
    security: endpoint.access === 'public' ? [] : [{ bearer: [] }, { cookie: [] }],
  };
}

/** The API as OpenAPI 3.1, made from the contract alone. */
export function openApiDocument(endpoints: readonly Endpoint[], version: string): Json {
  const paths: Record<string, Json> = {};
  for (const endpoint of endpoints) paths[endpoint.path] = { ...paths[endpoint.path], [endpoint.method]: operationOf(endpoint) };
  return {
    openapi: '3.1.0', info: { title: 'Leeside', version, description: 'From analyzer sweeps to attenuation curves that stand up.' }, servers: [{ url: '/api/v1' }], paths,
    components: { schemas: { Problem: toJson(problemSchema, 'output') }, securitySchemes: { bearer: { type: 'http', scheme: 'bearer' }, cookie: { type: 'apiKey', in: 'cookie', name: 'access' } } },
  };
}
