import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { openPanel } from './openPanel'

/** A proposal of any panel the person leads in a call, by its review number; one they have an interest in is not there. */
export async function ledProposal(
  ctx: ActingContext,
  key: { callSlug: string; reviewNumber: string },
): Promise<{ id: number; panelId: number }> {
  const first = await openPanel(ctx, { callSlug: key.callSlug })
  const led = [first]
  for (const { id } of first.others) led.push(await openPanel(ctx, { callSlug: key.callSlug, panelId: id }))
  for (const desk of led) {
    const proposal = desk.proposals.find(({ reviewNumber }) => reviewNumber === key.reviewNumber)
    if (proposal) return { id: proposal.id, panelId: desk.panel.id }
  }
  throw refuse.notFound('proposal')
}
