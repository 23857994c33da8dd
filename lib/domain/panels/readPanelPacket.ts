import { readSnapshot } from '@/db/queries/versions'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { packetFor } from '../packets/packetFor'
import { ledProposal } from './ledProposal'

/** The packet without names, for whoever leads the panel and has no interest in the proposal. */
export async function readPanelPacket(
  ctx: ActingContext,
  key: { callSlug: string; reviewNumber: string },
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const { id } = await ledProposal(ctx, key)
  const sent = await readSnapshot(ctx.db, id)
  if (!sent) throw refuse.notFound('packet')
  const { bytes } = await packetFor(ctx, sent.id, 'anonymised')
  return { bytes, fileName: `${key.reviewNumber}.pdf` }
}
