// Brings the database at DATABASE_URL up to date. Several at once are harmless: one works, the others wait for it.
const url = process.env.DATABASE_URL;
if (!url) {
  console.error('DATABASE_URL is not set. For development: eval "$(docker-less-scripts/services env)"');
  process.exit(1);
}

const { migrateToLatest } = await import('@leeside/database/migrate').catch((error) => {
  if (error.code !== 'ERR_MODULE_NOT_FOUND') throw error;
  console.error('packages/database is not built yet: npm run build');
  process.exit(1);
});

const applied = await migrateToLatest(url);
const names = Array.isArray(applied) ? applied : [];
console.log(names.length === 0 ? 'The database is up to date.' : `Applied: ${names.join(', ')}`);
process.exit(0);
