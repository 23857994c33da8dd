import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE refunds
      MODIFY payment_id INT UNSIGNED NULL COMMENT 'of which payment; null when an invoice was paid',
      ADD invoice_id INT UNSIGNED NULL COMMENT 'of which settled invoice' AFTER payment_id,
      ADD is_surplus TINYINT(1) NOT NULL DEFAULT 0 COMMENT 'money that was never owed: paid twice or too late' AFTER amount_minor,
      ADD failure VARCHAR(200) NOT NULL DEFAULT '' COMMENT 'why it failed' AFTER state,
      ADD closed_at DATETIME(3) NULL COMMENT 'when it was made or failed' AFTER made_by,
      ADD CONSTRAINT refunds_invoice_id_foreign FOREIGN KEY (invoice_id) REFERENCES invoices (id) ON DELETE RESTRICT,
      ADD CONSTRAINT refunds_of_one CHECK ((payment_id IS NULL) <> (invoice_id IS NULL))`,
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE refunds
      DROP CONSTRAINT refunds_of_one,
      DROP FOREIGN KEY refunds_invoice_id_foreign,
      DROP KEY refunds_invoice_id_foreign,
      DROP invoice_id, DROP is_surplus, DROP failure, DROP closed_at,
      MODIFY payment_id INT UNSIGNED NOT NULL COMMENT 'of which payment'`,
  )
}
