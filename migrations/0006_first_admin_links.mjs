/** One-time links by which an empty lab gets its first administrator. */
export async function up(knex) {
  await knex.raw(`
    create table first_admin_links (
      lab_id uuid primary key references labs,
      token_hash bytea not null unique,
      created_at timestamptz not null default now(),
      used_at timestamptz
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
