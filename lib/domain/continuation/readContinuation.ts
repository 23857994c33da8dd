import { findProposal } from '@/db/queries/proposals'
import { programmeInCall } from '@/db/queries/programmes'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { readContents } from '../proposals/readContents'
import { readOpenKinds, type OpenKind } from '../proposals/readOpenKinds'
import { mayReadProposal } from '../proposals/policy'
import type { ProposalContents } from '../proposals/types'
import { mayContinue } from './policy'

export interface Continuation {
  contents: ProposalContents
  /** Kinds of open calls it can be carried on in, the kind it was first. */
  kinds: OpenKind[]
  /** Why it cannot be carried on now, in a sentence; null when it can. */
  whyNot: string | null
}

/** Where a proposal can be carried on now, for whoever may do so. */
export async function readContinuation(ctx: ActingContext, reference: string): Promise<Continuation> {
  const contents = await readContents(ctx.db, reference)
  authorize(mayContinue(ctx.actor, contents))
  const row = await findProposal(ctx.db, contents.id)
  if (!row) throw refuse.notFound('proposal')
  const later = (await readOpenKinds(ctx)).filter(({ call }) => call.id !== contents.call.id)
  if (later.length === 0)
    return { contents, kinds: [], whyNot: 'No other call is open. Come back when the next one opens.' }
  const taken = new Set<number>()
  let whyNot: string | null = null
  for (const call of new Map(later.map((one) => [one.call.id, one.call])).values()) {
    const standing = await programmeInCall(ctx.db, row.programme_id, call.id)
    if (!standing) continue
    taken.add(call.id)
    const { people } = await readContents(ctx.db, standing.id)
    const which = mayReadProposal(ctx.actor, { people }).allowed ? `: ${standing.reference}` : ''
    whyNot = `This programme has a proposal in call ${call.number} already${which}.`
  }
  const kinds = later
    .filter(({ call }) => !taken.has(call.id))
    .sort((a, b) => Number(b.kind.kind === contents.kind.kind) - Number(a.kind.kind === contents.kind.kind))
  return { contents, kinds, whyNot: kinds.length > 0 ? null : whyNot }
}
