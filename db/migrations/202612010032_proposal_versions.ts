import type { Knex } from 'knex'
import { exactText, instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('proposal_versions', (t) => {
    t.comment('What was sent: a frozen snapshot with every computed number')
    t.increments('id').comment('key')
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'which proposal').notNullable()
    t.integer('version_number').unsigned().notNullable().comment('counts from 1, never reused')
    t.json('snapshot').notNullable().comment('everything, with the computed numbers')
    exactText(t, 'snapshot_sha256', 64, 'fingerprint of the snapshot').notNullable()
    t.string('engine_version', 40).notNullable().comment('engine that computed it')
    reference(t, 'paper_id', 'papers', 'RESTRICT', 'justification sent').notNullable()
    exactText(t, 'idempotency_key', 64, 'one press of the button, one version').notNullable().unique()
    instant(
      t,
      'arrived_at',
      'arrival, stamped by the database as the first thing the request did',
    ).notNullable()
    instant(t, 'committed_at', 'when it was stored').notNullable()
    reference(t, 'submitted_by', 'people', 'RESTRICT', 'who sent it').notNullable()
    instant(t, 'superseded_at', 'when a newer version took its place')
    t.unique(['proposal_id', 'version_number'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('proposal_versions')
}
