import type { Knex } from 'knex'

// What is written here is a record of what happened: the database itself refuses to change it.
export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    "CREATE TRIGGER money_entries_no_update BEFORE UPDATE ON money_entries FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'money_entries is append-only'",
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('DROP TRIGGER money_entries_no_update')
}
