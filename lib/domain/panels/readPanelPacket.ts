import { readSnapshot } from '@/db/queries/versions'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { packetFor } from '../packets/packetFor'
import { openPanel } from './openPanel'

/** The packet without names, for whoever leads the panel and has no interest in the proposal. */
export async function readPanelPacket(
  ctx: ActingContext,
  key: { callSlug: string; reviewNumber: string },
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const first = await openPanel(ctx, { callSlug: key.callSlug })
  const led = [first]
  for (const { id } of first.others) led.push(await openPanel(ctx, { callSlug: key.callSlug, panelId: id }))
  const proposal = led
    .flatMap((desk) => desk.proposals)
    .find(({ reviewNumber }) => reviewNumber === key.reviewNumber)
  const sent = proposal ? await readSnapshot(ctx.db, proposal.id) : null
  if (!sent) throw refuse.notFound('packet')
  const { bytes } = await packetFor(ctx, sent.id, 'anonymised')
  return { bytes, fileName: `${key.reviewNumber}.pdf` }
}
