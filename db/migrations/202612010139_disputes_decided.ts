import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE disputes
      ADD decision ENUM('ask-again', 'waive', 'withdraw', 'accept') NULL COMMENT 'what the office made of a dispute that was lost' AFTER closed_at,
      ADD decision_note VARCHAR(300) NOT NULL DEFAULT '' COMMENT 'why' AFTER decision,
      ADD decided_by INT UNSIGNED NULL COMMENT 'who decided' AFTER decision_note,
      ADD decided_at DATETIME(3) NULL COMMENT 'when' AFTER decided_by,
      ADD CONSTRAINT disputes_decided_by_foreign FOREIGN KEY (decided_by) REFERENCES people (id) ON DELETE SET NULL`,
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE disputes
      DROP FOREIGN KEY disputes_decided_by_foreign,
      DROP KEY disputes_decided_by_foreign,
      DROP decision, DROP decision_note, DROP decided_by, DROP decided_at`,
  )
}
