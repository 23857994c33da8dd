import type { Knex } from 'knex'
import { exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('logbook', (t) => {
    t.comment('Who did what and when; append-only, each row hashes the one before')
    t.increments('id').comment('key')
    instant(t, 'at', 'when').notNullable()
    reference(t, 'person_id', 'people', 'RESTRICT', 'who; null for the clock')
    t.string('acting_as', 40).notNullable().comment('role acted in')
    exactText(t, 'action', 60, 'verb').notNullable()
    exactText(t, 'subject_kind', 40, 'noun').notNullable()
    exactText(t, 'subject_id', 40, 'key or public number').notNullable()
    t.json('before_value').comment('what it was')
    t.json('after_value').comment('what it became')
    exactText(t, 'request_id', 40, 'request').notNullable()
    t.string('address', 60).notNullable().defaultTo('').comment('from where')
    exactText(t, 'previous_hash', 64, 'hash of the row before').notNullable()
    exactText(t, 'hash', 64, 'SHA-256 over this row and the hash before').notNullable().unique()
    t.index(['subject_kind', 'subject_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('logbook')
}
