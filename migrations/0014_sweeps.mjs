/** The numbers of a trace: little-endian float32 levels, uncompressed so that any window can be cut out, a pyramid of minima and maxima beside them; frequencies as start and step, or as float64. */
export async function up(knex) {
  await knex.raw(`
    create table sweeps (
      trace_id uuid primary key references traces on delete cascade,
      lab_id uuid not null references labs,
      axis_start_hz double precision not null,
      axis_step_hz double precision,
      frequency_f64 bytea,
      level_f32 bytea not null,
      pyramid_f32 bytea,
      check ((axis_step_hz is null) = (frequency_f64 is not null))
    );
    alter table sweeps alter column level_f32 set storage external;
    alter table sweeps alter column frequency_f64 set storage external;
    alter table sweeps alter column pyramid_f32 set storage external;
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
