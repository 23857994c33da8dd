import { feeOf } from '@/db/queries/fees'
import { Refusal } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { askForWaiver } from '../fees/askForWaiver'
import { startPayment } from '../fees/startPayment'
import { submitProposal, type SubmitInput } from './submitProposal'

export interface SendAndSettleInput extends SubmitInput {
  then: 'pay' | 'later' | 'waiver'
  waiverReason: string
}

/**
 * Sends a proposal in, then does what was wished about its fee. Once it is in, nothing that fails afterwards
 * undoes that: the confirmation says what is still to be settled.
 */
export async function sendAndSettle(
  ctx: ActingContext,
  input: SendAndSettleInput,
): Promise<{ goTo: string }> {
  const { proposalId, reference } = await submitProposal(ctx, input)
  const confirmation = paths.proposalSent(reference)
  const fee = await feeOf(ctx.db, proposalId)
  if (fee?.state !== 'due' || input.then === 'later') return { goTo: confirmation }
  try {
    if (input.then === 'pay') return { goTo: (await startPayment(ctx, { reference })).url }
    await askForWaiver(ctx, { reference, reason: input.waiverReason })
    return { goTo: confirmation }
  } catch (error) {
    if (!(error instanceof Refusal)) throw error
    return { goTo: `${confirmation}?fee=${error.kind === 'unavailable' ? 'unanswered' : 'unsettled'}` }
  }
}
