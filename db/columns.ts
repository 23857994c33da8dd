import type { Knex } from 'knex'

// Migrations already run depend on these: add to them, never change one.
type Table = Knex.CreateTableBuilder

/** Foreign key to `table.id`; `onDelete` is a choice made at every use. */
export function reference(
  t: Table,
  column: string,
  table: string,
  onDelete: 'RESTRICT' | 'CASCADE' | 'SET NULL',
  comment: string,
): Knex.ReferencingColumnBuilder {
  return t.integer(column).unsigned().references('id').inTable(table).onDelete(onDelete).comment(comment)
}

/** A moment in UTC, to the millisecond. */
export function instant(t: Table, column: string, comment: string): Knex.ColumnBuilder {
  return t.datetime(column, { precision: 3 }).comment(comment)
}

/** The moment the row was made, by the database's clock. */
export function createdAt(t: Table): Knex.ColumnBuilder {
  return t
    .specificType('created_at', 'DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)')
    .comment('when the row was made (UTC)')
}

/** Case- and space-exact text for tokens, hashes and keys: the default collation would match look-alikes. */
export function exactText(t: Table, column: string, length: number, comment: string): Knex.ColumnBuilder {
  return t.specificType(column, `VARCHAR(${length}) CHARACTER SET ascii COLLATE ascii_bin`).comment(comment)
}

/** Optimistic concurrency: every UPDATE names the version it read. */
export function version(t: Table): Knex.ColumnBuilder {
  return t
    .integer('version')
    .unsigned()
    .notNullable()
    .defaultTo(1)
    .comment('raised by every update; an update names the version it read')
}

/** A measured value; the unit is in the column's name. */
export function measured(t: Table, column: string, comment: string): Knex.ColumnBuilder {
  return t.double(column).comment(comment)
}
