import { takeInvitation, tieInvestigator, type OpenInvitation } from '@/db/queries/invitations'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { giveRole } from '../roles/giveRole'

/** Takes the invitation and gives the role it promised; within the caller's transaction. */
export async function grantInvited(tx: Context, invitation: OpenInvitation, personId: number): Promise<void> {
  if (!(await takeInvitation(tx.db, invitation.id, personId)))
    throw refuse.closed('This invitation has been accepted already.')
  // Named on a proposal: every account is an investigator's, and agreeing to be named is a step of its own.
  if (invitation.proposal_id !== null) {
    await tieInvestigator(tx.db, { proposalId: invitation.proposal_id, email: invitation.email, personId })
    return writeLogbook(tx, {
      action: 'accept-invitation',
      subject: { kind: 'invitation', id: invitation.id },
      actingAs: 'visitor',
      after: { personId, proposal: invitation.proposal_reference },
    })
  }
  await giveRole(tx, {
    personId,
    role: invitation.role,
    callId: invitation.call_id,
    panelId: invitation.panel_id,
    instrumentId: invitation.instrument_id,
    fromAt: null,
    untilAt: invitation.role_until_at,
    grantedBy: invitation.invited_by,
  })
  await writeLogbook(tx, {
    action: 'accept-invitation',
    subject: { kind: 'invitation', id: invitation.id },
    actingAs: 'visitor',
    after: { personId, role: invitation.role },
  })
}
