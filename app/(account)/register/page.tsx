import type { Metadata } from 'next'
import { RegisterForm } from '@/components/account/RegisterForm'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { paths } from '@/lib/paths'
import { registerAction } from './actions'

export const metadata: Metadata = { title: 'Open an account' }

export default async function RegisterPage() {
  await openPage('/register')
  return (
    <Main>
      <PageTitle
        title="Open an account"
        lead="One account for all calls. We send a letter to your address to show that it is yours."
      />
      <div className="mt-6 max-w-lg">
        <RegisterForm action={registerAction} />
        <p className="mt-6">
          You have one already? <TextLink href={paths.signIn()}>Sign in</TextLink>
        </p>
      </div>
    </Main>
  )
}
