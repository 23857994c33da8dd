import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { packetFor } from '../packets/packetFor'
import { canOpenReview } from './policy'
import { reviewFacts } from './reviewFacts'

/** The packet without names, under the review number. */
export async function readReviewPacket(
  ctx: ActingContext,
  assignmentId: number,
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const facts = await reviewFacts(ctx, assignmentId, false)
  authorize(canOpenReview(ctx.actor, facts))
  const version = await readSnapshot(ctx.db, facts.assignment.proposalId)
  if (!version) throw refuse.notFound('review')
  const { bytes } = await packetFor(ctx, version.id, 'anonymised')
  return { bytes, fileName: `${facts.assignment.reviewNumber ?? 'packet'}.pdf` }
}
