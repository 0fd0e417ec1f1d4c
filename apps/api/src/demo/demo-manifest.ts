import { readFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { z } from 'zod';
import { measuringRoleSchema } from '@leeside/contracts/measuring-roles';
import { requirementSegmentSchema } from '@leeside/contracts/requirements';

/** The folder of the demo lab's files. */
export const demoFolder = join(dirname(fileURLToPath(import.meta.url)), '..', '..', '..', '..', 'sample-data', 'demo');

const sizeSchema = z.array(z.number()).length(3);
const manifestSchema = z.object({
  clients: z.array(z.object({ key: z.string(), name: z.string() })),
  designs: z.array(z.object({ key: z.string(), name: z.string(), kind: z.string(), closure: z.string(), layers: z.number(), insideSizeM: sizeSchema })),
  lots: z.array(z.object({ code: z.string(), designKey: z.string(), receivedOn: z.string(), quantity: z.number() })),
  samples: z.array(z.object({ code: z.string(), name: z.string(), lotCode: z.string().nullable(), designKey: z.string(), clientKey: z.string(), insideSizeM: sizeSchema, notes: z.string() })),
  requirements: z.array(z.object({ key: z.string(), name: z.string(), rule: z.enum(['simple', 'guarded']), standsForRatio: z.number(), segments: z.array(requirementSegmentSchema) })),
  sessions: z.array(z.object({
    key: z.string(), title: z.string(), heldOn: z.string(), impedanceOhm: z.number(), requirementKey: z.string(), floorMarginDb: z.union([z.literal(3), z.literal(6), z.literal(10)]), notes: z.string(),
    files: z.array(z.object({ path: z.string(), role: measuringRoleSchema, sampleCode: z.string().nullable(), condition: z.string().nullable(), polarisation: z.string(), position: z.string(), measuredAt: z.string() })),
    levels: z.array(z.object({ role: measuringRoleSchema, sampleCode: z.string().nullable(), condition: z.string().nullable(), frequencyHz: z.number(), levelDbm: z.number(), inTheNoise: z.boolean() })),
  })),
});
export type DemoManifest = z.infer<typeof manifestSchema>;
export type DemoSession = DemoManifest['sessions'][number];

/** What the demo lab holds. */
export async function readDemoManifest(): Promise<DemoManifest> {
  return manifestSchema.parse(JSON.parse(await readFile(join(demoFolder, 'manifest.json'), 'utf8')));
}
