import type { Knex } from 'knex'
import { exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposal_people', (t) => {
    exactText(t, 'orcid', 19, 'ORCID iD as typed by whoever named them; the account has its own')
    t.boolean('is_supervisor').notNullable().defaultTo(false).comment('supervises the student named')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('proposal_people', (t) => {
    t.dropColumn('orcid')
    t.dropColumn('is_supervisor')
  })
}
