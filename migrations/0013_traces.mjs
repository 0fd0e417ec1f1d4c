/** What a session knows of each sweep: its role, its sample, its settings. The numbers stand in sweeps. */
export async function up(knex) {
  await knex.raw(`
    create table traces (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      session_id uuid not null references sessions,
      file_id uuid not null references files on delete cascade,
      place_in_file integer not null,
      name text not null,
      role text check (role in ('reference', 'enclosed', 'noise', 'leakage', 'ambient')),
      role_guessed boolean not null default false,
      sample_id uuid references samples,
      sample_guessed boolean not null default false,
      condition text not null default '',
      polarisation text not null default '',
      position text not null default '',
      measured_at timestamptz,
      chain_loss_db double precision,
      transmit_level_dbm double precision,
      paired_with uuid references traces on delete set null,
      point_count integer not null,
      start_hz double precision not null,
      stop_hz double precision not null,
      level_unit text not null,
      settings jsonb not null default '{}',
      peak_frequency_hz double precision not null,
      peak_level real not null,
      style text,
      set_aside text,
      version integer not null default 1,
      unique (file_id, place_in_file)
    );
    create index traces_session on traces (session_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
