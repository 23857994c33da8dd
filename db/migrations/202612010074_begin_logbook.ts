import type { Knex } from 'knex'

// The chain starts from a fixed value, so that an emptied logbook cannot pass for a new one.
export async function up(knex: Knex): Promise<void> {
  await knex('logbook_head').insert({ id: 1, last_hash: '0'.repeat(64) })
}

export async function down(knex: Knex): Promise<void> {
  await knex('logbook_head').where({ id: 1 }).delete()
}
