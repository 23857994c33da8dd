import type { z } from 'zod'
import { findPanelScope, findInstrumentName } from '@/db/queries/panelScopes'
import { insertInvitation } from '@/db/queries/invitations'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { invitationLetter } from '../outbox/letters/invitation'
import { queueLetter } from '../outbox/queueLetter'
import { mailedToken } from '../sessions/mailedToken'
import { mayInvite } from './policy'
import { roleWords } from './roleWords'
import type { inviteSchema } from './schema'

const lifeDays = 21

/** Invites a person to a role by letter; the role is given when the link is accepted. */
export async function invite(
  ctx: ActingContext,
  input: z.output<typeof inviteSchema>,
): Promise<{ id: number }> {
  authorize(mayInvite(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const needsPanel = input.role === 'reviewer' || input.role === 'chair'
    const panel = needsPanel ? await findPanelScope(tx.db, Number(input.panelId)) : null
    if (needsPanel && !panel) throw refuse.field('panelId', 'There is no such panel.')
    const needsInstrument = input.role === 'instrument-scientist'
    const instrument = needsInstrument ? await findInstrumentName(tx.db, Number(input.instrumentId)) : null
    if (needsInstrument && !instrument) throw refuse.field('instrumentId', 'There is no such instrument.')

    const { token, hash } = mailedToken(tx.random)
    const id = await insertInvitation(tx.db, {
      tokenHash: hash,
      email: input.email,
      name: input.name,
      role: input.role,
      callId: panel?.callId ?? null,
      panelId: panel?.id ?? null,
      instrumentId: instrument?.id ?? null,
      invitedBy: tx.actor.personId,
      lifeDays,
    })
    const where = panel ? `the panel ${panel.name} of call ${panel.callNumber}` : (instrument?.name ?? null)
    const letter = invitationLetter(
      input,
      roleWords[input.role],
      where,
      tx.actor.name,
      tx.request.origin + paths.invitation(token),
    )
    await queueLetter(
      tx,
      { personId: null, email: input.email, name: input.name },
      letter,
      `invitation:${id}`,
    )
    await writeLogbook(tx, {
      action: 'invite',
      subject: { kind: 'invitation', id },
      actingAs: 'office',
      after: { role: input.role, panelId: panel?.id ?? null, instrumentId: instrument?.id ?? null },
    })
    return { id }
  })
}
