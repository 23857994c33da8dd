import type { Knex } from 'knex'

// What is written here is a record of what happened: the database itself refuses to change it.
export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    "CREATE TRIGGER payment_events_no_delete BEFORE DELETE ON payment_events FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'payment_events is append-only'",
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('DROP TRIGGER payment_events_no_delete')
}
