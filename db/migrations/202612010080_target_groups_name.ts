import type { Knex } from 'knex'

const name = 'target_groups_name_in_proposal'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('target_groups', (t) => {
    t.unique(['proposal_id', 'name'], { indexName: name })
  })
}

export async function down(knex: Knex): Promise<void> {
  // The foreign key leans on an index that begins with its column: its own goes back before this one goes.
  await knex.schema.alterTable('target_groups', (t) => {
    t.index(['proposal_id'], 'target_groups_proposal_id_foreign')
  })
  await knex.schema.alterTable('target_groups', (t) => {
    t.dropUnique(['proposal_id', 'name'], name)
  })
}
