import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('papers', (t) => {
    t.comment('Uploaded documents; a replaced one stays, superseded')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    reference(t, 'object_id', 'stored_objects', 'RESTRICT', 'the bytes').notNullable()
    t.enum('kind', ['justification', 'team-expertise']).notNullable().comment('what it is')
    t.string('file_name', 200)
      .notNullable()
      .comment('name on the machine of the author; never shown to reviewers')
    t.integer('pages').unsigned().notNullable().comment('pages')
    reference(t, 'uploaded_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when it was replaced or taken off')
    createdAt(t)
    t.index(['proposal_id', 'kind', 'superseded_at'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('papers')
}
