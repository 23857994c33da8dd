import type { Knex } from 'knex'
import { createdAt, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('writings', (t) => {
    t.comment('Texts written here, as they stand; a part nobody has written has no row')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    t.enum('part', ['justification', 'references', 'team']).notNullable().comment('which text it is')
    t.text('body', 'mediumtext').notNullable().comment('as typed: Markdown with TeX, or BibTeX')
    version(t)
    createdAt(t)
    instant(t, 'updated_at', 'last change').notNullable()
    t.unique(['proposal_id', 'part'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('writings')
}
