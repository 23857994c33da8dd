import { insertInvitation } from '@/db/queries/invitations'
import type { ProposalsRow } from '@/db/tables'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { mailedToken } from '../sessions/mailedToken'

const lifeDays = 60

/**
 * Where someone named answers: the proposal's people for the owner of an account, else a link that opens one for
 * this address. The caller holds the transaction and sends the link by letter, nowhere else.
 */
export async function answerLink(
  tx: Context,
  proposal: Pick<ProposalsRow, 'id' | 'reference'>,
  named: { name: string; email: string; hasAccount: boolean },
): Promise<string> {
  if (named.hasAccount || !tx.actor) return paths.proposalSection(proposal.reference, 'people')
  const { token, hash } = mailedToken(tx.random)
  await insertInvitation(tx.db, {
    tokenHash: hash,
    email: named.email,
    name: named.name,
    role: 'investigator',
    callId: null,
    panelId: null,
    instrumentId: null,
    proposalId: proposal.id,
    invitedBy: tx.actor.personId,
    lifeDays,
  })
  return paths.invitation(token)
}
