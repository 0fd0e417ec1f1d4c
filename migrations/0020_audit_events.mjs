/** Who did what, when; rows are only ever added, and each carries the hash of the one before. */
export async function up(knex) {
  await knex.raw(`
    create table audit_events (
      id bigint primary key generated always as identity,
      lab_id uuid not null references labs,
      person_id uuid references people,
      action text not null,
      subject_kind text not null,
      subject_id text,
      details jsonb not null default '{}',
      at timestamptz not null default clock_timestamp(),
      previous_hash text not null,
      hash text not null
    );
    create index audit_events_lab on audit_events (lab_id, id);
    create function refuse_audit_change() returns trigger language plpgsql as \$\$
    begin
      raise exception 'the audit trail is append-only';
    end \$\$;
    create trigger audit_events_append_only before update or delete or truncate on audit_events
      for each statement execute function refuse_audit_change();
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
