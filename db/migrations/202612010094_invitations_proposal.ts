import type { Knex } from 'knex'
import { reference } from '../columns.ts'

const offices = ['reviewer', 'chair', 'instrument-scientist', 'office']

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('invitations', (t) => {
    t.enum('role', [...offices, 'investigator'])
      .notNullable()
      .comment('role it grants')
      .alter()
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'proposal that names an investigator')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex('invitations').where({ role: 'investigator' }).delete()
  await knex.schema.alterTable('invitations', (t) => {
    t.dropForeign('proposal_id')
    t.dropColumn('proposal_id')
    t.enum('role', offices).notNullable().comment('role it grants').alter()
  })
}
