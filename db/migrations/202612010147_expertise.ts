import type { Knex } from 'knex'
import { createdAt, reference } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('expertise', (t) => {
    t.comment('What a reviewer says they know, so that proposals find readers; written anew as a whole')
    t.increments('id').comment('key')
    reference(t, 'person_id', 'people', 'RESTRICT', 'who says so').notNullable()
    t.enum('kind', ['category', 'word']).notNullable().comment('a science category, or a word of their own')
    t.string('term', 80).notNullable().comment('the category or the word')
    t.integer('level').unsigned().comment('1 knows it, 2 works in it, 3 the main field; none for a word')
    createdAt(t)
    t.check("(kind = 'category') = (level IS NOT NULL)", [], 'expertise_level_of_category')
    t.check('level BETWEEN 1 AND 3', [], 'expertise_level_in_range')
    t.unique(['person_id', 'kind', 'term'])
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('expertise')
}
