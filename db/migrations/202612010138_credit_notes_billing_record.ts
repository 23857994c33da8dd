import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE credit_notes
      ADD billing_record_id INT UNSIGNED NULL COMMENT 'who wrote it; null before that was kept' AFTER address,
      ADD CONSTRAINT credit_notes_billing_record_id_foreign FOREIGN KEY (billing_record_id) REFERENCES billing_records (id) ON DELETE RESTRICT`,
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE credit_notes
      DROP FOREIGN KEY credit_notes_billing_record_id_foreign,
      DROP KEY credit_notes_billing_record_id_foreign,
      DROP billing_record_id`,
  )
}
