import type { Metadata } from 'next'
import { ConfirmForm } from '@/components/account/ConfirmForm'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { confirmAddressAction } from './actions'

export const metadata: Metadata = { title: 'Confirm your address', referrer: 'no-referrer' }

// A button, not the visit itself: mail programs open links to look at them, and writes never happen by GET.
export default async function ConfirmPage({ params }: { params: Promise<{ token: string }> }) {
  await openPage('/confirm/[token]')
  const { token } = await params
  return (
    <Main>
      <PageTitle title="Confirm your address" lead="One press, and the account is yours." />
      <div className="mt-6 max-w-lg">
        <ConfirmForm token={token} action={confirmAddressAction} />
      </div>
    </Main>
  )
}
