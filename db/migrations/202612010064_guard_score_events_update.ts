import type { Knex } from 'knex'

// What is written here is a record of what happened: the database itself refuses to change it.
export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    "CREATE TRIGGER score_events_no_update BEFORE UPDATE ON score_events FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'score_events is append-only'",
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('DROP TRIGGER score_events_no_update')
}
