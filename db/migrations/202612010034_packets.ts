import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('packets', (t) => {
    t.comment('The proposal as one PDF, by version and variant')
    t.increments('id').comment('key')
    reference(t, 'proposal_version_id', 'proposal_versions', 'RESTRICT', 'which version').notNullable()
    t.enum('variant', ['anonymised', 'full']).notNullable().comment('for the panel, or with names')
    reference(t, 'object_id', 'stored_objects', 'RESTRICT', 'the bytes').notNullable()
    t.integer('pages').unsigned().notNullable().comment('pages')
    exactText(t, 'content_hash', 64, 'hash of what went in: same in, same packet').notNullable()
    instant(t, 'superseded_at', 'when it was rendered anew')
    createdAt(t)
    t.index(['proposal_version_id', 'variant'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('packets')
}
