/** Who sends samples. */
export async function up(knex) {
  await knex.raw(`
    create table clients (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      name text not null,
      created_at timestamptz not null default now(),
      unique (lab_id, name)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
