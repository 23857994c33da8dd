import type { Database } from '@/db/client'
import type { Context } from './context'

// 1020: the row changed since it was read; 1205: lock wait; 1213: deadlock.
const retried = new Set([1020, 1205, 1213])
const tries = 5

function errnoOf(error: unknown): number | null {
  return typeof error === 'object' && error !== null && 'errno' in error && typeof error.errno === 'number'
    ? error.errno
    : null
}

/** Runs a verb's work in one transaction, anew as a whole when MariaDB gave it up for another. */
export async function inTransaction<C extends Context, T>(ctx: C, work: (tx: C) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await ctx.db.transaction((trx: Database) => work({ ...ctx, db: trx }))
    } catch (error) {
      const errno = errnoOf(error)
      if (attempt >= tries || errno === null || !retried.has(errno)) throw error
      await new Promise((resolve) => setTimeout(resolve, 10 * 2 ** attempt * (0.5 + Math.random())))
    }
  }
}
