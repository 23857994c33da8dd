import { papersOf } from '@/db/queries/papers'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { findProposal } from '@/db/queries/proposals'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayReadProposal } from '../proposals/policy'
import { storedBytes } from './storedBytes'

/** A standing document of a proposal, for its investigators and the office. */
export async function readPaper(
  ctx: Context,
  input: { reference: string; paperId: number },
): Promise<{ bytes: Uint8Array; fileName: string }> {
  if (!ctx.actor) throw refuse.notSignedIn()
  const row = await findProposal(ctx.db, input.reference)
  if (!row) throw refuse.notFound('proposal')
  authorize(mayReadProposal(ctx.actor, { people: await investigatorsOf(ctx.db, row.id) }))
  const paper = (await papersOf(ctx.db, row.id)).find(({ id }) => id === input.paperId)
  if (!paper) throw refuse.notFound('document')
  return { bytes: await storedBytes(ctx, paper), fileName: paper.fileName }
}
