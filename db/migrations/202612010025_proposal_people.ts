import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('proposal_people', (t) => {
    t.comment('Investigators of a proposal; some have no account yet')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    reference(t, 'person_id', 'people', 'SET NULL', 'account, once there is one')
    t.string('name', 160).notNullable().comment('name')
    t.string('email', 254).notNullable().comment('address')
    t.string('institute', 200).notNullable().defaultTo('').comment('institute')
    t.enum('role', ['pi', 'co-investigator']).notNullable().comment('principal or co-investigator')
    t.enum('access', ['read', 'edit', 'deputy'])
      .notNullable()
      .defaultTo('edit')
      .comment('what they may do; a deputy may send')
    t.boolean('is_student').notNullable().defaultTo(false).comment('student')
    t.integer('position').unsigned().notNullable().comment('order of names')
    instant(t, 'confirmed_at', 'when the person agreed to be named')
    createdAt(t)
    t.unique(['proposal_id', 'email'])
    t.index(['person_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('proposal_people')
}
