import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { packetFor } from '../packets/packetFor'
import { canSeeRequest } from './policy'
import { requestFacts } from './requestFacts'

/** The packet without names, for the staff of an instrument. */
export async function readRequestPacket(
  ctx: ActingContext,
  requestId: number,
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const facts = await requestFacts(ctx, requestId, false)
  authorize(canSeeRequest(ctx.actor, facts))
  const version = await readSnapshot(ctx.db, facts.request.proposalId)
  if (!version) throw refuse.notFound('request')
  const { bytes } = await packetFor(ctx, version.id, 'anonymised')
  return { bytes, fileName: `${facts.request.reviewNumber ?? 'packet'}.pdf` }
}
