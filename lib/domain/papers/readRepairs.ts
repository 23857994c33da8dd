import { repairsOf } from '@/db/queries/paperRepairs'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { findProposal } from '@/db/queries/proposals'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { mayReadProposal } from '../proposals/policy'
import type { PaperRepair } from './repairTypes'

/** Papers of a proposal the office has opened for a replacement, for its investigators and the office. */
export async function readRepairs(ctx: ActingContext, reference: string): Promise<PaperRepair[]> {
  const row = await findProposal(ctx.db, reference)
  if (!row) throw refuse.notFound('proposal')
  authorize(mayReadProposal(ctx.actor, { people: await investigatorsOf(ctx.db, row.id) }))
  return repairsOf(ctx.db, row.id)
}
