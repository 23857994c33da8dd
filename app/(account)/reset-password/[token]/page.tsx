import type { Metadata } from 'next'
import { ResetPasswordForm } from '@/components/account/ResetPasswordForm'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { resetPasswordAction } from './actions'

export const metadata: Metadata = { title: 'Choose a new password', referrer: 'no-referrer' }

export default async function ResetPasswordPage({ params }: { params: Promise<{ token: string }> }) {
  await openPage('/reset-password/[token]')
  const { token } = await params
  return (
    <Main>
      <PageTitle
        title="Choose a new password"
        lead="Every browser that is signed in with this account will be signed out."
      />
      <div className="mt-6 max-w-lg">
        <ResetPasswordForm token={token} action={resetPasswordAction} />
      </div>
    </Main>
  )
}
