/** MariaDB refused a row because a unique key has it already. Told by number: the names mislead. */
export function isDuplicate(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'errno' in error && error.errno === 1062
}
