import type { Knex } from 'knex'

// What is written here is a record of what happened: the database itself refuses to change it.
export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    "CREATE TRIGGER recusals_no_update BEFORE UPDATE ON recusals FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'recusals is append-only'",
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('DROP TRIGGER recusals_no_update')
}
