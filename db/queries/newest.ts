import type { Database } from '../client.ts'

/**
 * Runs one statement that reads the newest committed row, whatever the transaction has read before. With
 * innodb_snapshot_isolation MariaDB answers 1020 to a lock on a row that changed after the transaction's first read:
 * right for the rows a verb decides on, wrong for a counter or the end of the logbook, which every writer moves
 * and nobody decides on.
 */
export function newest(
  db: Database,
  statement: string,
  bindings: readonly (string | number)[],
): Promise<unknown> {
  return db.raw(`SET STATEMENT innodb_snapshot_isolation = OFF FOR ${statement}`, [...bindings])
}
