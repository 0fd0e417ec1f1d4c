import { openDatabase } from '@leeside/database/open-database';
import { hashPassword } from './authentication/passwords.js';
import { readConfiguration } from './configuration.js';
import { readDemoManifest } from './demo/demo-manifest.js';
import { seedDemoLab } from './demo/seed-demo-lab.js';
import { seedEmptyLab } from './demo/seed-empty-lab.js';

const configuration = readConfiguration();
const mode = process.argv.includes('--empty') ? 'empty' : 'demo';
const db = openDatabase({ url: configuration.databaseUrl, poolSize: 2 });

if (mode === 'demo') {
  if (configuration.demoPassword === null) throw new Error('DEMO_PASSWORD must be set to 8 characters or more.');
  await seedDemoLab(db, await readDemoManifest(), await hashPassword(configuration.demoPassword));
} else {
  const token = await seedEmptyLab(db);
  if (token !== null) process.stdout.write(`The lab has no administrator yet. Open this link once: ${configuration.baseUrl}/first-admin?token=${token}\n`);
}
await db.destroy();
