/** Designs of enclosures. */
export async function up(knex) {
  await knex.raw(`
    create table designs (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      client_id uuid references clients,
      name text not null,
      kind text not null,
      closure text not null,
      layers integer not null default 1,
      inside_size_m double precision[],
      created_at timestamptz not null default now(),
      unique (lab_id, name)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
