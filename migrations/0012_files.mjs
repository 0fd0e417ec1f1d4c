/** Files as they came. The bytes lie in the object store under their hash; states change by compare-and-set on (state, attempt). */
export async function up(knex) {
  await knex.raw(`
    create table files (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      session_id uuid not null references sessions,
      name text not null,
      sha256 text not null,
      byte_count bigint not null,
      state text not null default 'waiting' check (state in ('waiting', 'reading', 'read', 'needs answer', 'refused')),
      attempt integer not null default 0,
      heartbeat_at timestamptz not null default now(),
      upload_order bigint generated always as identity,
      fields jsonb not null default '{}',
      answers jsonb not null default '[]',
      transcription jsonb,
      doubts jsonb not null default '[]',
      problem jsonb,
      questions jsonb,
      set_aside_at timestamptz,
      uploaded_by uuid not null references people,
      uploaded_at timestamptz not null default now(),
      unique (session_id, sha256)
    );
    create index files_unfinished on files (heartbeat_at) where state in ('waiting', 'reading');
    create index files_stored on files (lab_id, sha256);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
