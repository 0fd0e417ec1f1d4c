/** Work that a transaction made necessary; the relay hands it to the queue. */
export async function up(knex) {
  await knex.raw(`
    create table outbox (
      id bigint primary key generated always as identity,
      lab_id uuid not null references labs,
      kind text not null check (kind in ('read-files', 'compute-curves')),
      session_id uuid not null references sessions,
      file_id uuid references files on delete cascade,
      created_at timestamptz not null default now(),
      sent_at timestamptz
    );
    create index outbox_unsent on outbox (id) where sent_at is null;
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
