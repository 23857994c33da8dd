import { lastChangeOf } from '@/db/queries/logbook'
import { refuse, type Refusal } from '@/lib/errors'
import type { Context } from '../context'

/**
 * The refusal of a save that came second: who was first, when, and what stands there now. Who was first is whoever
 * changed the proposal last, or, where `about` says so, whoever did one of these things to what has this name.
 */
export async function staleProposal(
  tx: Context,
  proposal: { reference: string; version: number; updated_at: Date },
  theirs: Record<string, unknown>,
  about?: { actions: readonly string[]; name: string },
): Promise<Refusal> {
  const last = await lastChangeOf(tx.db, 'proposal', proposal.reference, about)
  const isOwn = last?.personId !== null && last?.personId === tx.actor?.personId
  return refuse.stale({
    changedBy: isOwn ? 'Another window of yours' : (last?.name ?? 'Someone else'),
    changedAt: (last?.at ?? proposal.updated_at).toISOString(),
    version: proposal.version,
    theirs,
  })
}
