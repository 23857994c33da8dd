import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE invoices
      ADD billing_record_id INT UNSIGNED NULL COMMENT 'who wrote it and where it is paid to; null before that was kept' AFTER address,
      ADD CONSTRAINT invoices_billing_record_id_foreign FOREIGN KEY (billing_record_id) REFERENCES billing_records (id) ON DELETE RESTRICT`,
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE invoices
      DROP FOREIGN KEY invoices_billing_record_id_foreign,
      DROP KEY invoices_billing_record_id_foreign,
      DROP billing_record_id`,
  )
}
