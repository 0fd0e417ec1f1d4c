import { createLab, keepFirstAdminLink, listLabs } from '@leeside/database/lab-store';
import type { Database } from '@leeside/database/open-database';
import { hasAdmin } from '@leeside/database/person-store';
import { createRequirement } from '@leeside/database/requirement-store';
import { hashToken, randomToken } from '../authentication/random-token.js';

/** Makes an empty lab; while it has no administrator, leaves a one-time link and answers its token. */
export async function seedEmptyLab(db: Database): Promise<string | null> {
  const [known] = await listLabs(db);
  const lab = known ?? (await createLab(db, 'My lab'));
  if (known === undefined) {
    await createRequirement(db, lab.id, { name: 'Rule of thumb: at least 50 dB from 100 kHz to 1 GHz (common practice, no source)', rule: 'simple', segments: [{ fromHz: 100e3, toHz: 1e9, fromDb: 50, toDb: 50 }] });
  }
  if (await hasAdmin(db, lab.id)) return null;
  const token = randomToken();
  await keepFirstAdminLink(db, lab.id, hashToken(token));
  return token;
}
