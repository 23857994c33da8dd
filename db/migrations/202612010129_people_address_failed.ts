import type { Knex } from 'knex'
import { instant } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.alterTable('people', (t) => {
    instant(
      t,
      'address_failed_at',
      'when a mail server refused the address for good; cleared by a letter taken',
    )
    t.string('address_failed_why', 300).comment('what the mail server said')
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.alterTable('people', (t) => {
    t.dropColumn('address_failed_at')
    t.dropColumn('address_failed_why')
  })
}
