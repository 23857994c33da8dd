import { givenByTelescope } from '@/db/queries/decisions'
import { heldTime, replaceHeld } from '@/db/queries/nightTerms'
import { offeredTime } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import { formatHoursFromSeconds } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import type { PanelDesk } from '../panels/openPanel'
import { offeredByTelescope } from '../rankings/offered'
import { openDecisions } from './openDecisions'
import type { HeldInput } from './schema'

/** Holds hours of a telescope back, for the director and targets of opportunity; no panel can give them then. */
export function holdHours(ctx: ActingContext, input: HeldInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk } = await openDecisions(tx, input.panelId)
    const { telescopeId, hours: seconds, reason } = input
    const before = (await heldTime(tx.db, desk.call.id)).get(telescopeId) ?? null
    const why = await whyNotHeld(tx, desk, telescopeId, seconds)
    if (why) throw refuse.field('hours', why)
    await replaceHeld(tx.db, {
      ...{ callId: desk.call.id, telescopeId, seconds, reason },
      by: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'decision.hold-hours',
      subject: { kind: 'call', id: desk.call.number },
      actingAs: 'chair',
      before: before ? { telescopeId, ...before } : undefined,
      after: { telescopeId, seconds, reason },
    })
  })
}

/** Why so much of a telescope cannot be held back; null where it can. */
export async function whyNotHeld(
  tx: ActingContext,
  desk: PanelDesk,
  telescopeId: number,
  seconds: number,
): Promise<string | null> {
  const offered = offeredByTelescope(await offeredTime(tx.db, desk.call.id)).get(telescopeId)
  if (offered === undefined) return 'This telescope has no nights in the call.'
  const left = offered - ((await givenByTelescope(tx.db, desk.call.id)).get(telescopeId) ?? 0)
  if (seconds <= left) return null
  return `Only ${formatHoursFromSeconds(Math.max(0, left))} are not given yet; take hours back first.`
}
