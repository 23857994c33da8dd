import type { Knex } from 'knex'
import { version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposal_people', (t) => {
    version(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposal_people', (t) => {
    t.dropColumn('version')
  })
}
