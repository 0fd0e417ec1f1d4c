import { createClient, createDesign, createLot } from '@leeside/database/intake-store';
import { createLab } from '@leeside/database/lab-store';
import { inTransaction, type Database } from '@leeside/database/open-database';
import { changePasswordHash, createPerson, findPersonByEmail } from '@leeside/database/person-store';
import { createRequirement } from '@leeside/database/requirement-store';
import { createSample } from '@leeside/database/sample-store';
import { demoAccounts } from './demo-accounts.js';
import type { DemoManifest } from './demo-manifest.js';

const ruleOfThumb = {
  name: 'Rule of thumb: at least 50 dB from 100 kHz to 1 GHz (common practice, no source)', rule: 'simple' as const, segments: [{ fromHz: 100e3, toHz: 1e9, fromDb: 50, toDb: 50 }],
};

async function idsByKey<Item>(items: readonly Item[], keyOf: (item: Item) => string, create: (item: Item) => Promise<string>): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const item of items) ids.set(keyOf(item), await create(item));
  return ids;
}

/** Fills an empty database with the demo lab; the people's password is set anew at every start. */
export async function seedDemoLab(db: Database, manifest: DemoManifest, passwordHash: string): Promise<void> {
  const known = await findPersonByEmail(db, demoAccounts[0]?.email ?? '');
  if (known !== null) {
    for (const { email } of demoAccounts) {
      const person = await findPersonByEmail(db, email);
      if (person !== null) await changePasswordHash(db, person.id, passwordHash);
    }
    return;
  }
  await inTransaction(db, async (trx) => {
    const { id: labId } = await createLab(trx, 'Leeside demo lab');
    const clients = await idsByKey(manifest.clients, ({ key }) => key, ({ name }) => createClient(trx, labId, name));
    const clientOf = (key: string | undefined): { clientId?: string } => {
      const clientId = key === undefined ? undefined : clients.get(key);
      return clientId === undefined ? {} : { clientId };
    };
    for (const { email, name, roles, clientKey } of demoAccounts) await createPerson(trx, { labId, email, name, roles, passwordHash, ...clientOf(clientKey) });
    const designs = await idsByKey(manifest.designs, ({ key }) => key, ({ key: _key, ...design }) => createDesign(trx, { labId, ...design }));
    const lots = await idsByKey(manifest.lots, ({ code }) => code, ({ designKey, ...lot }) => createLot(trx, { labId, designId: designs.get(designKey) ?? '', ...lot }));
    for (const { lotCode, designKey, clientKey, ...sample } of manifest.samples) {
      await createSample(trx, labId, { ...sample, ...clientOf(clientKey), designId: designs.get(designKey), lotId: lotCode === null ? undefined : lots.get(lotCode) });
    }
    await createRequirement(trx, labId, ruleOfThumb);
    for (const { key: _key, ...requirement } of manifest.requirements) if (requirement.name !== ruleOfThumb.name) await createRequirement(trx, labId, requirement);
  });
}
