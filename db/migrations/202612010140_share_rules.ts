import type { Knex } from 'knex'
import { createdAt, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('share_rules', (t) => {
    t.comment(
      'How the panels of a call share the time of each telescope; superseded, never overwritten, fixed once a list is frozen',
    )
    t.increments('id').comment('key')
    reference(t, 'call_id', 'calls', 'RESTRICT', 'which call').notNullable()
    t.enum('rule', ['hours', 'proposals', 'fixed'])
      .notNullable()
      .comment('by hours asked, by number of proposals, or as the office wrote')
    t.json('percents').comment('for a fixed rule: panel and its whole percent, adding up to 100')
    t.string('reason', 300).notNullable().comment('why')
    reference(t, 'made_by', 'people', 'RESTRICT', 'who').notNullable()
    instant(t, 'superseded_at', 'when another took its place')
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('share_rules')
}
