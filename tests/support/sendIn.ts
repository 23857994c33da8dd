import { randomUUID } from 'node:crypto'
import { databaseNow } from '@/db/queries/clock'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import type { Submission } from '@/lib/domain/submission/freezeVersion'
import { submitProposal } from '@/lib/domain/submission/submitProposal'

/** Sends the scenario's draft as its principal investigator would, a press of the button each time. */
export async function sendIn(
  ctx: ActingContext & { actor: Actor },
  reference: string,
  over: { idempotencyKey?: string; arrivedAt?: Date } = {},
): Promise<Submission> {
  return submitProposal(ctx, {
    reference,
    idempotencyKey: over.idempotencyKey ?? randomUUID(),
    declaration: true,
    arrivedAt: over.arrivedAt ?? (await databaseNow(ctx.db)),
  })
}
