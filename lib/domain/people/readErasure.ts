import { inTheWayOfErasure, keptAfterErasure } from '@/db/queries/erasure'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { wayWords, whatGoes, whatStays, type ErasureView } from './erasureWords'
import { mayExportPerson } from './policy'

/** What would go and what would stay, and what stands in the way; for the person and for the office. */
export async function readErasure(ctx: ActingContext, personId: number): Promise<ErasureView> {
  authorize(mayExportPerson(ctx.actor, personId))
  const [way, kept] = await Promise.all([
    inTheWayOfErasure(ctx.db, personId),
    keptAfterErasure(ctx.db, personId),
  ])
  return { inTheWay: wayWords(way), goes: [...whatGoes], stays: whatStays(kept) }
}
