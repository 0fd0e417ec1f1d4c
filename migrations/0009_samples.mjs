/** Samples: what came in the parcel. */
export async function up(knex) {
  await knex.raw(`
    create table samples (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      code text not null,
      name text not null,
      lot_id uuid references lots,
      design_id uuid references designs,
      client_id uuid references clients,
      state text not null default 'received'
        check (state in ('received', 'on the bench', 'measured', 'released', 'held', 'returned')),
      inside_size_m double precision[],
      notes text,
      created_at timestamptz not null default date_trunc('milliseconds', now()),
      unique (lab_id, code)
    );
    create index samples_newest on samples (lab_id, created_at desc, id);
    create index samples_client on samples (client_id);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
