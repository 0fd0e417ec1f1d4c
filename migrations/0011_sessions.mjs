/** A session at the bench. */
export async function up(knex) {
  await knex.raw(`
    create table sessions (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      title text not null,
      held_on date not null,
      impedance_ohm double precision not null default 50,
      requirement_id uuid references requirements,
      floor_margin_db double precision not null,
      notes text,
      created_by uuid not null references people,
      created_at timestamptz not null default date_trunc('milliseconds', now())
    );
    create index sessions_latest on sessions (lab_id, held_on desc, created_at desc, id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
