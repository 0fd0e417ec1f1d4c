/** Who is signed in where; the refresh token is kept as a hash, with its predecessor for the tabs that come too late. */
export async function up(knex) {
  await knex.raw(`
    create table sign_in_sessions (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      person_id uuid not null references people on delete cascade,
      refresh_hash bytea not null unique,
      previous_hash bytea,
      rotated_at timestamptz not null default now(),
      successor_sealed text,
      created_at timestamptz not null default now(),
      last_used_at timestamptz not null default now(),
      expires_at timestamptz not null,
      ended_at timestamptz
    );
    create index sign_in_sessions_previous on sign_in_sessions (previous_hash);
    create index sign_in_sessions_person on sign_in_sessions (person_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
