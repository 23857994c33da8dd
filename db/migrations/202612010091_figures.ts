import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('figures', (t) => {
    t.comment('Figures of the written justification; one taken off stays, since a version sent may hold it')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'CASCADE', 'which proposal').notNullable()
    reference(
      t,
      'object_id',
      'stored_objects',
      'RESTRICT',
      'the picture, without what cameras write into it',
    ).notNullable()
    exactText(t, 'label', 40, 'what the text calls it: [@fig:label]').notNullable()
    t.text('caption').notNullable().comment('words under it, Markdown with TeX')
    t.string('file_name', 200)
      .notNullable()
      .comment('name on the machine of the author; never shown to reviewers')
    t.integer('width_px').unsigned().notNullable().comment('width, pixels')
    t.integer('height_px').unsigned().notNullable().comment('height, pixels')
    t.integer('position').unsigned().notNullable().comment('order, from 1')
    instant(t, 'removed_at', 'when it was taken off')
    version(t)
    createdAt(t)
    t.index(['proposal_id', 'removed_at'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('figures')
}
