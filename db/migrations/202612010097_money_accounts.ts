import type { Knex } from 'knex'

const first = "'receivable','income','provider','waived','refunds'"
const further = "'invoiced','bank','owed-back','disputed','firm-fees','lost'"

const column = (accounts: string) =>
  `ALTER TABLE money_entries MODIFY account ENUM(${accounts}) NOT NULL COMMENT 'account'`

export async function up(knex: Knex): Promise<void> {
  await knex.raw(column(`${first},${further}`))
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(column(first))
}
