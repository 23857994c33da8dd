import type { Knex } from 'knex'

// What other calls offer in a night is asked for whenever a night is set.
export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('night_blocks', (t) =>
    t.index(['evening_date', 'telescope_id'], 'night_blocks_by_night'),
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('night_blocks', (t) => t.dropIndex([], 'night_blocks_by_night'))
}
