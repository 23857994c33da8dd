import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('proposals', (t) => {
    t.comment('Proposals; a draft is edited here, a sent one is a row of proposal_versions')
    t.increments('id').comment('key')
    exactText(t, 'reference', 7, 'public reference, six of Crockford base 32, last a check character')
      .notNullable()
      .unique()
    reference(t, 'programme_id', 'programmes', 'RESTRICT', 'programme it belongs to').notNullable()
    reference(t, 'call_id', 'calls', 'RESTRICT', 'call').notNullable()
    reference(t, 'call_kind_id', 'call_kinds', 'RESTRICT', 'kind').notNullable()
    reference(t, 'panel_id', 'panels', 'RESTRICT', 'panel that judges it; set when sent')
    t.enum('state', [
      'draft',
      'submitted',
      'under-review',
      'awarded',
      'reserve',
      'declined',
      'withdrawn',
      'lapsed',
    ])
      .notNullable()
      .defaultTo('draft')
      .comment('state')
    t.boolean('is_reopened')
      .notNullable()
      .defaultTo(false)
      .comment('a sent proposal being edited again; the sent version stands')
    exactText(t, 'review_number', 8, 'call and three random digits, for the panel; unlinked to the reference')
    t.string('title', 240).notNullable().defaultTo('').comment('title')
    t.text('abstract').notNullable().comment('abstract')
    t.string('category', 80).notNullable().defaultTo('').comment('science category')
    exactText(t, 'cosmology_id', 40, 'preset, or custom').notNullable().defaultTo('planck-2018')
    t.json('cosmology_parameters').notNullable().comment('parameters of the chosen cosmology')
    exactText(t, 'comparison_cosmology_id', 40, 'preset shown beside it')
    t.json('sections_done').notNullable().comment('sections the author calls done')
    instant(t, 'closes_at', 'own deadline, given by the office')
    instant(t, 'withdrawn_at', 'when it was withdrawn')
    t.string('withdrawn_reason', 500).comment('why')
    reference(t, 'created_by', 'people', 'RESTRICT', 'who began it').notNullable()
    version(t)
    createdAt(t)
    instant(t, 'updated_at', 'last change').notNullable()
    t.unique(['call_id', 'review_number'])
    t.index(['call_id', 'state'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('proposals')
}
