import type { ActingContext } from '../context'
import type { ProposalContents } from '../proposals/types'
import { mayContinue } from './policy'
import { readContinuation } from './readContinuation'

/** Number of the call the reader can carry a proposal on in now; null for none, and for who may not. */
export async function whereToContinue(
  ctx: ActingContext,
  contents: ProposalContents,
): Promise<number | null> {
  if (!mayContinue(ctx.actor, contents).allowed) return null
  const { kinds } = await readContinuation(ctx, contents.reference)
  return kinds[0]?.call.number ?? null
}
