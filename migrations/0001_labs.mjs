/** The lab: every other row belongs to one. */
export async function up(knex) {
  await knex.raw(`
    create table labs (
      id uuid primary key default gen_random_uuid(),
      name text not null,
      time_zone text not null default 'UTC',
      floor_margin_db double precision not null default 6,
      drift_limit_db double precision not null default 3,
      created_at timestamptz not null default now()
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
