/** Lots in which samples come. */
export async function up(knex) {
  await knex.raw(`
    create table lots (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      design_id uuid not null references designs,
      code text not null,
      state text not null default 'open' check (state in ('open', 'released', 'held')),
      made_on date,
      received_on date,
      quantity integer,
      created_at timestamptz not null default now(),
      unique (lab_id, code)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
