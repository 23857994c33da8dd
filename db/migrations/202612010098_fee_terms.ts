import type { Knex } from 'knex'

const states = "'due','paid','waived','invoiced','refunded','lapsed'"

const column = (list: string) =>
  `MODIFY state ENUM(${list}) NOT NULL DEFAULT 'due' COMMENT 'state; cancelled: withdrawn before it was paid'`

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE fees ${column(`${states},'cancelled'`)},
      ADD affiliation_class ENUM('member','partner','other') NOT NULL DEFAULT 'other' COMMENT 'class of the institute that leads, when it was billed' AFTER currency,
      ADD late_minor INT UNSIGNED NOT NULL DEFAULT 0 COMMENT 'part of the amount asked for sending late' AFTER affiliation_class`,
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    `ALTER TABLE fees MODIFY state ENUM(${states}) NOT NULL DEFAULT 'due' COMMENT 'state',
      DROP affiliation_class, DROP late_minor`,
  )
}
