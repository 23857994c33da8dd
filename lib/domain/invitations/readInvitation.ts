import { findOpenInvitation } from '@/db/queries/invitations'
import { findPersonByEmail } from '@/db/queries/people'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { secretHash } from '../sessions/secretHash'
import { roleWords } from './roleWords'

export interface InvitationView {
  name: string
  email: string
  role: string
  where: string | null
  inviter: string | null
  expiresAt: Date
  /** The proposal that names them, and where they answer; null for an office of the observatory. */
  proposal: { title: string; answerAt: string } | null
  /** The address has an account: sign in with it instead of making one. */
  hasAccount: boolean
}

/** What an invitation says, for whoever holds its link; null when it cannot be accepted any more. */
export async function readInvitation(ctx: Context, token: string): Promise<InvitationView | null> {
  const row = await findOpenInvitation(ctx.db, secretHash(token))
  if (!row) return null
  const account = await findPersonByEmail(ctx.db, row.email)
  const panel = row.panel_name ? `the panel ${row.panel_name} of call ${row.call_number}` : null
  return {
    name: row.name,
    email: row.email,
    role: roleWords[row.role],
    where: panel ?? row.instrument_name,
    inviter: row.inviter,
    proposal: row.proposal_reference
      ? {
          title: row.proposal_title || 'a proposal without a title yet',
          answerAt: paths.proposalSection(row.proposal_reference, 'people'),
        }
      : null,
    expiresAt: row.expires_at,
    hasAccount: Boolean(account?.email_confirmed_at),
  }
}
