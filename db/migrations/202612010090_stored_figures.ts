import type { Knex } from 'knex'

const purposes = (knex: Knex, names: readonly string[]) =>
  knex.raw(
    `ALTER TABLE stored_objects MODIFY purpose ENUM(${names.map((name) => `'${name}'`).join(', ')}) NOT NULL COMMENT 'what it is'`,
  )

export async function up(knex: Knex): Promise<void> {
  await purposes(knex, ['paper', 'packet', 'receipt', 'record', 'figure'])
}

export async function down(knex: Knex): Promise<void> {
  await purposes(knex, ['paper', 'packet', 'receipt', 'record'])
}
