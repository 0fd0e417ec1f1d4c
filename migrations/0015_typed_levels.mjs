/** Levels read off the screen by eye. */
export async function up(knex) {
  await knex.raw(`
    create table typed_levels (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      session_id uuid not null references sessions,
      role text not null check (role in ('reference', 'enclosed', 'noise', 'leakage', 'ambient')),
      sample_id uuid references samples,
      condition text not null default '',
      frequency_hz double precision not null,
      level_dbm double precision not null,
      in_the_noise boolean not null default false,
      entry_order bigint generated always as identity,
      entered_by uuid not null references people,
      entered_at timestamptz not null default now()
    );
    create index typed_levels_session on typed_levels (session_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
