import type { Knex } from 'knex'
import { instant, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('conflicts', (t) => {
    t.comment('A person has an interest in a proposal; enforced on pages, counts and exports')
    t.increments('id').comment('key')
    reference(t, 'person_id', 'people', 'RESTRICT', 'who has the interest').notNullable()
    reference(t, 'proposal_id', 'proposals', 'RESTRICT', 'in which proposal').notNullable()
    t.enum('kind', ['investigator', 'institute', 'collaborator', 'family', 'rival', 'other'])
      .notNullable()
      .comment('kind')
    t.enum('severity', ['barred', 'disclosed'])
      .notNullable()
      .defaultTo('barred')
      .comment('barred from it, or only disclosed')
    t.enum('source', ['declared', 'matched', 'chair']).notNullable().comment('who found it')
    t.string('note', 300).notNullable().defaultTo('').comment('what was said')
    reference(t, 'decided_by', 'people', 'SET NULL', 'who decided')
    instant(t, 'from_at', 'holds from').notNullable()
    instant(t, 'until_at', 'holds until')
    t.unique(['person_id', 'proposal_id', 'kind', 'source'])
    t.index(['proposal_id'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('conflicts')
}
