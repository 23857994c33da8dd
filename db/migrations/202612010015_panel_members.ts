import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('panel_members', (t) => {
    t.comment('Who sits on a panel, in which seat')
    t.increments('id').comment('key')
    reference(t, 'panel_id', 'panels', 'RESTRICT', 'which panel').notNullable()
    reference(t, 'person_id', 'people', 'RESTRICT', 'who').notNullable()
    t.enum('seat', ['chair', 'deputy', 'member']).notNullable().comment('seat')
    t.integer('number').unsigned().notNullable().comment('number shown in place of the name')
    instant(t, 'left_at', 'when the seat was given up')
    createdAt(t)
    t.unique(['panel_id', 'person_id'])
    t.unique(['panel_id', 'number'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('panel_members')
}
