import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { DemoAccounts } from '@/components/account/DemoAccounts'
import { SignInForm } from '@/components/account/SignInForm'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { readDemoAccounts } from '@/lib/domain/people/readDemoAccounts'
import { openPage } from '@/lib/auth/openPage'
import { env } from '@/lib/env'
import { ownPath, paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ next?: string | string[]; confirmed?: string; reset?: string }>
}) {
  const ctx = await openPage('/sign-in')
  const query = await searchParams
  const next = ownPath([query.next].flat()[0], paths.proposals())
  if (ctx.actor) redirect(next)
  const demo = env().NOCTUARY_MODE === 'production' ? [] : await readDemoAccounts(ctx)
  return (
    <Main>
      <TwoColumns side={demo.length > 0 ? <DemoAccounts accounts={demo} inboxUrl={env().INBOX_URL} /> : null}>
        <PageTitle title="Sign in" lead={leadOf(query)} />
        <div className="mt-6 max-w-lg">
          <SignInForm next={next} />
          <p className="mt-6 flex flex-wrap gap-x-6 gap-y-2">
            <TextLink href={paths.forgotPassword()}>I do not know my password</TextLink>
            <TextLink href={paths.register()}>Open an account</TextLink>
          </p>
        </div>
      </TwoColumns>
    </Main>
  )
}

function leadOf(query: { next?: unknown; confirmed?: string; reset?: string }): string {
  if (query.confirmed) return 'Your address is confirmed. Sign in to begin.'
  if (query.reset) return 'Your new password holds from now on.'
  return query.next
    ? 'The page you asked for needs to know who you are; you come back to it.'
    : 'For proposals, reviews, assessments, the panel and the office.'
}
