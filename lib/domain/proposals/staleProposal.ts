import { lastChangeOf } from '@/db/queries/logbook'
import { refuse, type Refusal } from '@/lib/errors'
import type { Context } from '../context'

/** The refusal of a save that came second: who was first, when, and what stands there now. */
export async function staleProposal(
  tx: Context,
  proposal: { reference: string; version: number; updated_at: Date },
  theirs: Record<string, unknown>,
): Promise<Refusal> {
  const last = await lastChangeOf(tx.db, 'proposal', proposal.reference)
  const isOwn = last?.personId !== null && last?.personId === tx.actor?.personId
  return refuse.stale({
    changedBy: isOwn ? 'Another window of yours' : (last?.name ?? 'Someone else'),
    changedAt: (last?.at ?? proposal.updated_at).toISOString(),
    version: proposal.version,
    theirs,
  })
}
