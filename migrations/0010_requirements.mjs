/** What attenuation is asked for, in segments straight over log frequency. */
export async function up(knex) {
  await knex.raw(`
    create table requirements (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      name text not null,
      rule text not null check (rule in ('simple', 'guarded')),
      guard_factor double precision not null default 1,
      stands_for_ratio double precision not null default 1.1,
      created_at timestamptz not null default date_trunc('milliseconds', now())
    );
    create table requirement_segments (
      lab_id uuid not null references labs,
      requirement_id uuid not null references requirements on delete cascade,
      place integer not null,
      from_hz double precision not null,
      to_hz double precision not null,
      from_db double precision not null,
      to_db double precision not null,
      primary key (requirement_id, place),
      check (from_hz < to_hz)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
