import type { Knex } from 'knex'
import { reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('proposal_version_people', (t) => {
    t.comment('Names and institutes as they were when the proposal was sent')
    t.increments('id').comment('key')
    reference(t, 'proposal_version_id', 'proposal_versions', 'RESTRICT', 'which version').notNullable()
    reference(t, 'person_id', 'people', 'SET NULL', 'account')
    t.string('name', 160).notNullable().comment('name then')
    t.string('institute', 200).notNullable().comment('institute then')
    t.string('career_stage', 20).comment('career stage then')
    t.enum('role', ['pi', 'co-investigator']).notNullable().comment('role')
    t.integer('position').unsigned().notNullable().comment('order')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('proposal_version_people')
}
