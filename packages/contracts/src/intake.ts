import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { dateSchema, idSchema, listOf } from './field-schemas.js';

export const lotStates = ['open', 'released', 'held'] as const;
export const listClients = endpoint({
  name: 'listClients', method: 'get', path: '/clients', summary: 'Clients of the lab', access: 'lab.read',
  answers: { 200: listOf(z.object({ id: idSchema, name: z.string() })) },
});
export const designSchema = z.object({
  id: idSchema, name: z.string(), kind: z.string(), closure: z.string(), layers: z.number().int(),
  insideSizeM: z.array(z.number()).length(3).nullable(),
});
export const listDesigns = endpoint({
  name: 'listDesigns', method: 'get', path: '/designs', summary: 'Designs by name', access: 'lab.read', answers: { 200: listOf(designSchema) },
});
export const lotSchema = z.object({
  id: idSchema, code: z.string(), designId: idSchema, designName: z.string(), state: z.enum(lotStates), receivedOn: dateSchema.nullable(), quantity: z.number().int().nullable(),
});
export const listLots = endpoint({
  name: 'listLots', method: 'get', path: '/lots', summary: 'Lots, newest first', access: 'lab.read', answers: { 200: listOf(lotSchema) },
});
