/** Tokens of programs, kept as hashes. */
export async function up(knex) {
  await knex.raw(`
    create table api_tokens (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      person_id uuid not null references people on delete cascade,
      name text not null,
      token_hash bytea not null unique,
      scopes text[] not null,
      created_at timestamptz not null default now(),
      last_used_at timestamptz,
      revoked_at timestamptz
    );
    create index api_tokens_person on api_tokens (person_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
