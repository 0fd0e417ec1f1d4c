import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { doubtSchema, idParamsSchema, idSchema, sha256Schema, timeSchema } from './field-schemas.js';
import { fileStates } from './file-states.js';
import { measuringRoleSchema } from './measuring-roles.js';
import { sweepSettingsSchema } from './sweep-settings.js';

export const fileStateSchema = z.enum(fileStates);

/** What is accepted in one request; shown in the interface and at `GET /limits`. */
export const uploadLimits = {
  fileBytes: 64 * 1024 * 1024, requestBytes: 2 * 1024 * 1024 * 1024, filesPerRequest: 200, fieldsPerRequest: 2000, nameCharacters: 200,
} as const;

/** Fields of the upload form; each describes the files after it until it is repeated, an empty one clears it. Texts as sent. */
const numberTextSchema = z.string().regex(/^[+-]?\d+(\.\d+)?$/).transform(Number).pipe(z.number().min(-400).max(400));
export const uploadFieldSchemas = {
  role: measuringRoleSchema,
  sampleId: idSchema,
  condition: z.string().trim().max(200),
  polarisation: z.string().trim().max(50),
  position: z.string().trim().max(50),
  measuredAt: timeSchema,
  chainLossDb: numberTextSchema,
  transmitLevelDbm: numberTextSchema,
} as const;
export type UploadFieldName = keyof typeof uploadFieldSchemas;

/** The fields that describe one file, checked. */
export const uploadFieldsSchema = z.object({
  role: measuringRoleSchema.optional(), sampleId: idSchema.optional(), condition: z.string().optional(), polarisation: z.string().optional(),
  position: z.string().optional(), measuredAt: timeSchema.optional(), chainLossDb: z.number().optional(), transmitLevelDbm: z.number().optional(),
});
export type UploadFields = z.infer<typeof uploadFieldsSchema>;

export const transcriptionSchema = z.object({
  encoding: z.string(), delimiter: z.string().nullable(), decimalMark: z.string().nullable(), frequencyUnit: z.string().nullable(),
  levelUnit: z.string().nullable(), headerLine: z.number().int().nullable(), firstDataLine: z.number().int().nullable(),
  rowsKept: z.number().int(), rowsSkipped: z.number().int(), settings: sweepSettingsSchema, decidedBy: z.record(z.string(), z.string()),
});
export const fileProblemSchema = z.object({
  code: z.string(), message: z.string(), line: z.number().int().optional(), column: z.number().int().optional(),
});
export const questionSchema = z.object({
  id: z.string(), code: z.string(), message: z.string(), lines: z.array(z.number().int()),
  choices: z.array(z.object({ id: z.string(), label: z.string(), sample: z.string() })),
});

export const uploadedFileSchema = z.object({
  id: idSchema, name: z.string(), sha256: sha256Schema, state: fileStateSchema, duplicateOf: idSchema.optional(),
});
export const fileSchema = z.object({
  id: idSchema, sessionId: idSchema, name: z.string(), sha256: sha256Schema, bytes: z.number().int(), state: fileStateSchema,
  uploadedAt: timeSchema, setAsideAt: timeSchema.nullable(),
  transcription: transcriptionSchema.optional(), doubts: z.array(doubtSchema), problem: fileProblemSchema.optional(),
  questions: z.array(questionSchema).optional(), traces: z.array(idSchema),
});
export type FileBody = z.infer<typeof fileSchema>;

export const uploadFiles = endpoint({
  name: 'uploadFiles', method: 'post', path: '/sessions/{id}/files', summary: 'Bring files into a session', access: 'file.upload',
  params: idParamsSchema, multipart: true, answers: { 202: z.object({ items: z.array(uploadedFileSchema) }) },
});
export const getFile = endpoint({
  name: 'getFile', method: 'get', path: '/files/{id}', summary: 'How a file was read', access: 'lab.read',
  params: idParamsSchema, answers: { 200: fileSchema },
});
export const getRawFile = endpoint({
  name: 'getRawFile', method: 'get', path: '/files/{id}/raw', summary: 'The bytes as they came', access: 'lab.read',
  params: idParamsSchema, answers: { 200: null }, answerType: 'application/octet-stream',
});
export const setFileAside = endpoint({
  name: 'setFileAside', method: 'delete', path: '/files/{id}', summary: 'Set a file aside', access: 'file.edit',
  params: idParamsSchema, answers: { 204: null },
});
export const bringFileBack = endpoint({
  name: 'bringFileBack', method: 'post', path: '/files/{id}/bring-back', summary: 'Bring a file back that was set aside', access: 'file.edit',
  params: idParamsSchema, answers: { 200: fileSchema },
});
export const readFileAgain = endpoint({
  name: 'readFileAgain', method: 'post', path: '/files/{id}/read-again', summary: 'Read a file once more', access: 'file.edit',
  params: idParamsSchema, answers: { 202: fileSchema },
});
export const answerQuestions = endpoint({
  name: 'answerQuestions', method: 'post', path: '/files/{id}/answers', summary: 'Answer what a file left open', access: 'file.edit',
  params: idParamsSchema,
  body: z.strictObject({
    answers: z.array(z.strictObject({ questionId: z.string().max(200), choiceId: z.string().max(200) })).min(1).max(50),
    remember: z.boolean().optional(),
  }),
  answers: { 202: fileSchema },
});
export const getLimits = endpoint({
  name: 'getLimits', method: 'get', path: '/limits', summary: 'What is accepted in one request', access: 'public',
  answers: { 200: z.object({ fileBytes: z.number(), requestBytes: z.number(), filesPerRequest: z.number(), fieldsPerRequest: z.number(), nameCharacters: z.number() }) },
});
