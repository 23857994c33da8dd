import type { Metadata } from 'next'
import { AcceptAsSelfForm } from '@/components/account/AcceptAsSelfForm'
import { AcceptInvitationForm } from '@/components/account/AcceptInvitationForm'
import { Main } from '@/components/layout/Main'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readInvitation } from '@/lib/domain/invitations/readInvitation'
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
          lead="It has been accepted, was taken back, or is too old. The office can send a new one."
        />
      </Main>
    )
  const isOwn = ctx.actor?.email.toLowerCase() === invitation.email.toLowerCase()
  return (
    <Main>
      <PageTitle
        title={`Be ${invitation.role}${invitation.where ? ` for ${invitation.where}` : ''}`}
        lead={`${invitation.inviter ?? 'The office'} invites ${invitation.name} at ${invitation.email}. Open until ${formatUtc(invitation.expiresAt)}.`}
      />
      <div className="mt-6 max-w-lg">
        {isOwn ? (
          <AcceptAsSelfForm token={token} action={acceptAsSelfAction} />
        ) : invitation.hasAccount ? (
          <>
            <p className="mb-4">This address has an account. Sign in with it to accept.</p>
            <LinkButton href={paths.signIn(paths.invitation(token))}>Sign in to accept</LinkButton>
          </>
        ) : (
          <AcceptInvitationForm token={token} name={invitation.name} action={acceptInvitationAction} />
        )}
      </div>
    </Main>
  )
}
