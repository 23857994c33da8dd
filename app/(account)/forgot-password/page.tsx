import type { Metadata } from 'next'
import { ForgotPasswordForm } from '@/components/account/ForgotPasswordForm'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { askForResetAction } from './actions'

export const metadata: Metadata = { title: 'A new password' }

export default async function ForgotPasswordPage() {
  await openPage('/forgot-password')
  return (
    <Main>
      <PageTitle
        title="A new password"
        lead="We send a link to your address. It works once, for ten minutes."
      />
      <div className="mt-6 max-w-lg">
        <ForgotPasswordForm action={askForResetAction} />
      </div>
    </Main>
  )
}
