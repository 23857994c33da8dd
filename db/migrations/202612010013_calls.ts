import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('calls', (t) => {
    t.comment(
      'Calls for proposals; open and closed follow from the clock, later stages from an act of the office',
    )
    t.increments('id').comment('key')
    t.integer('number').unsigned().notNullable().unique().comment('number of the call')
    exactText(t, 'slug', 60, 'name in addresses').notNullable().unique()
    t.string('title', 160).notNullable().comment('title')
    t.text('summary').notNullable().comment('what the call offers, in a paragraph')
    reference(t, 'site_id', 'sites', 'RESTRICT', 'site whose nights are offered').notNullable()
    t.enum('stage', ['planned', 'published', 'review', 'ranking', 'decided', 'archived'])
      .notNullable()
      .defaultTo('planned')
      .comment('last act of the office; open and closed are read from the dates')
    t.date('season_from').notNullable().comment('first evening on offer')
    t.date('season_to').notNullable().comment('last evening on offer')
    instant(t, 'opens_at', 'opening').notNullable()
    instant(t, 'closes_at', 'deadline').notNullable()
    instant(t, 'grace_until', 'fees are settled by').notNullable()
    instant(t, 'assessments_due_at', 'assessments are in by').notNullable()
    instant(t, 'reviews_due_at', 'reviews are in by').notNullable()
    instant(t, 'panel_meets_at', 'panel meets').notNullable()
    instant(t, 'letters_at', 'letters go out').notNullable()
    t.specificType('currency', 'CHAR(3) CHARACTER SET ascii').comment(
      'ISO 4217; null when the call has no fee',
    )
    version(t)
    createdAt(t)
    t.check('opens_at < closes_at', [], 'calls_dates_in_order')
    t.check('season_from <= season_to', [], 'calls_season_in_order')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('calls')
}
