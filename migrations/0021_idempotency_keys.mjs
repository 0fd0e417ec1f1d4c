/** Answers kept for a day, so that a request sent twice is done once. */
export async function up(knex) {
  await knex.raw(`
    create table idempotency_keys (
      lab_id uuid not null references labs,
      person_id uuid not null references people on delete cascade,
      key text not null,
      request_hash text not null,
      status integer,
      answer jsonb,
      created_at timestamptz not null default now(),
      primary key (person_id, key)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
