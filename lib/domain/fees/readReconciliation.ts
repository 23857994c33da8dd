import { z } from 'zod'
import { loggedDifferences } from '@/db/queries/reconciliation'
import { authorize } from '@/lib/auth/authorize'
import { Refusal } from '@/lib/errors'
import type { ActingContext } from '../context'
import { findDifferences, type Comparison } from './findDifferences'
import { mayHandleFees } from './policy'

export interface PastDifference {
  at: Date
  /** Who asked; null for the clock. */
  who: string | null
  reference: string | null
  payment: string
  ours: string
  theirs: string
  /** What was done; empty where it is for people. */
  repaired: string
}

export interface ReconciliationView {
  /** How the books stand against the firm's list at this moment; null when the firm does not answer. */
  now: Comparison | null
  past: PastDifference[]
}

const shown = 200

const logged = z.object({
  ours: z.string(),
  theirs: z.string(),
  payment: z.string(),
  repaired: z.string(),
})

/** The books against the firm's own list: what differs now, and what differed before with what was repaired. */
export async function readReconciliation(ctx: ActingContext): Promise<ReconciliationView> {
  authorize(mayHandleFees(ctx.actor))
  const past = await loggedDifferences(ctx.db, shown)
  return {
    now: await compared(ctx),
    past: past.flatMap((row) => {
      const read = logged.safeParse(row.after === null ? null : JSON.parse(row.after))
      if (!read.success) return []
      const reference = row.subjectKind === 'proposal' ? row.subjectId : null
      return [{ at: row.at, who: row.name, reference, ...read.data }]
    }),
  }
}

async function compared(ctx: ActingContext): Promise<Comparison | null> {
  try {
    return await findDifferences(ctx)
  } catch (error) {
    if (error instanceof Refusal) return null
    throw error
  }
}
