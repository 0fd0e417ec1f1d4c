/** Bands of curves as rows that carry their lot and design, so that lots compare without a join. */
export async function up(knex) {
  await knex.raw(`
    create table bands (
      curve_id uuid not null references curves on delete cascade,
      place integer not null,
      lab_id uuid not null references labs,
      sample_id uuid,
      lot_id uuid,
      design_id uuid,
      kind text not null,
      from_hz double precision not null,
      to_hz double precision not null,
      lowest jsonb,
      lowest_db double precision,
      at_least boolean,
      median_db double precision,
      median_at_least boolean not null,
      q10_db double precision,
      q10_at_least boolean not null,
      bound_share double precision not null,
      slope_db_per_decade double precision,
      primary key (curve_id, place)
    );
    create index bands_of_lots on bands (lot_id, from_hz, to_hz) include (sample_id, lowest_db, at_least);
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
