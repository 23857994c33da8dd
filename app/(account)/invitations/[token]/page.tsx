import type { Metadata } from 'next'
import { AcceptAsSelfForm } from '@/components/account/AcceptAsSelfForm'
import { AcceptInvitationForm } from '@/components/account/AcceptInvitationForm'
import { Main } from '@/components/layout/Main'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readInvitation, type InvitationView } from '@/lib/domain/invitations/readInvitation'
import { formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import { acceptAsSelfAction, acceptInvitationAction } from './actions'

export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer' }

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const ctx = await openPage('/invitations/[token]')
  const { token } = await params
  const invitation = await readInvitation(ctx, token)
  if (!invitation)
    return (
      <Main>
        <PageTitle
          title="This invitation is no longer open"
          lead="It has been accepted, was taken back, or is too old. Whoever invited you can send a new one."
        />
      </Main>
    )
  const isOwn = ctx.actor?.email.toLowerCase() === invitation.email.toLowerCase()
  return (
    <Main>
      <PageTitle title={titleOf(invitation)} lead={leadOf(invitation)} />
      <div className="mt-6 max-w-lg">
        {isOwn && invitation.proposal ? (
          <LinkButton href={invitation.proposal.answerAt}>Read the proposal and answer</LinkButton>
        ) : isOwn ? (
          <AcceptAsSelfForm token={token} action={acceptAsSelfAction} />
        ) : invitation.hasAccount ? (
          <>
            <p className="mb-4">This address has an account. Sign in with it to accept.</p>
            <LinkButton href={paths.signIn(invitation.proposal?.answerAt ?? paths.invitation(token))}>
              Sign in to accept
            </LinkButton>
          </>
        ) : (
          <AcceptInvitationForm
            token={token}
            name={invitation.name}
            send={invitation.proposal ? 'Open an account' : 'Accept and open an account'}
            action={acceptInvitationAction}
          />
        )}
      </div>
    </Main>
  )
}

function titleOf({ proposal, inviter, role, where }: InvitationView): string {
  if (proposal) return `${inviter ?? 'An investigator'} names you on a proposal`
  return `Be ${role}${where ? ` for ${where}` : ''}`
}

function leadOf({ proposal, inviter, name, email, expiresAt }: InvitationView): string {
  const until = `Open until ${formatUtc(expiresAt)}.`
  return proposal
    ? `“${proposal.title}”, for ${name} at ${email}. Open an account, sign in, and say whether you agree to be named. ${until}`
    : `${inviter ?? 'The office'} invites ${name} at ${email}. ${until}`
}
