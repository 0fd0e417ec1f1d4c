/** The columns of a curve, little-endian; NaN stands for none. */
export async function up(knex) {
  await knex.raw(`
    create table curve_points (
      curve_id uuid primary key references curves on delete cascade,
      lab_id uuid not null references labs,
      frequency_f64 bytea not null,
      attenuation_f32 bytea not null,
      at_least_u8 bytea not null,
      at_most_f32 bytea not null,
      ceiling_f32 bytea not null,
      uncertainty_f32 bytea not null,
      required_f32 bytea not null,
      excess_f32 bytea not null,
      reference_f32 bytea not null,
      enclosed_f32 bytea not null,
      floor_f32 bytea not null,
      mean_f32 bytea not null,
      spread_f32 bytea not null
    );
  `);
}

/** There is no way back but a restore: data of a later schema would be lost. */
export async function down() {
  throw new Error('Migrations only go forward; restore a backup instead.');
}
