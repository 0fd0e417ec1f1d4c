/** Curves: one a session, sample and condition; an enclosed sweep without a sample has its own. A result lands only on the attempt it was computed for. */
export async function up(knex) {
  await knex.raw(`
    create table curves (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      session_id uuid not null references sessions,
      sample_id uuid references samples,
      subject_trace_id uuid references traces on delete cascade,
      condition text not null default '',
      state text not null default 'pending' check (state in ('pending', 'ready', 'failed')),
      attempt integer not null default 1,
      revision integer not null default 0,
      marked_at timestamptz not null default now(),
      failure text,
      style text,
      point_count integer not null default 0,
      outcome text,
      decided_at_hz double precision,
      lowest jsonb,
      doubts jsonb not null default '[]',
      gaps jsonb not null default '[]',
      not_measured jsonb not null default '[]',
      inputs jsonb not null default '[]',
      pairs jsonb not null default '[]',
      parameters jsonb not null default '{}',
      floor_source text,
      drift_db double precision,
      analysis_version text,
      input_hash text,
      computed_at timestamptz,
      unique nulls not distinct (session_id, sample_id, subject_trace_id, condition)
    );
    create index curves_pending on curves (marked_at) where state = 'pending';
    create index curves_sample on curves (sample_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
