/** People of the lab and of its clients, with their roles. */
export async function up(knex) {
  await knex.raw(`
    create table people (
      id uuid primary key default gen_random_uuid(),
      lab_id uuid not null references labs,
      client_id uuid references clients,
      name text not null,
      email text not null,
      password_hash text not null,
      disabled_at timestamptz,
      created_at timestamptz not null default now()
    );
    create unique index people_email on people (lower(email));
    create table person_roles (
      lab_id uuid not null references labs,
      person_id uuid not null references people on delete cascade,
      role text not null check (role in ('engineer', 'analyst', 'qa', 'admin', 'client')),
      primary key (person_id, role)
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
