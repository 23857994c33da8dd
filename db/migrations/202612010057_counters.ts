import type { Knex } from 'knex'
import { exactText } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('counters', (t) => {
    t.comment('Numbers without gaps, drawn under a lock')
    exactText(t, 'name', 40, 'series').notNullable().primary()
    t.integer('last_number').unsigned().notNullable().defaultTo(0).comment('last number given')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('counters')
}
