import type { Metadata } from 'next'
import { ChangePasswordForm } from '@/components/account/ChangePasswordForm'
import { OwnData } from '@/components/account/OwnData'
import { ProfileForm } from '@/components/account/ProfileForm'
import { SessionList } from '@/components/account/SessionList'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { desksOf } from '@/components/layout/desks'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readSessionId } from '@/lib/auth/readActor'
import { readFrame } from '@/lib/domain/calls/readFrame'
import { readErasure } from '@/lib/domain/people/readErasure'
import { readAccount } from '@/lib/domain/people/readAccount'
import {
  askForErasureAction,
  changePasswordAction,
  endOtherSessionsAction,
  saveProfileAction,
} from './actions'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const ctx = await openPage('/account')
  const [account, frame, erasure] = await Promise.all([
    readAccount(ctx, await readSessionId()),
    readFrame(ctx, null),
    readErasure(ctx, ctx.actor.personId),
  ])
  const zones = ['UTC', ...Intl.supportedValuesOf('timeZone').filter((zone) => zone !== 'UTC')]
  const { sessions, erasureAskedAt, ...profile } = account
  return (
    <Main>
      <PageTitle title="Your account" lead={account.email} />
      <div className="mt-10">
        <TwoColumns
          side={
            <>
              <section>
                <SectionHeading title="Your desks" dense />
                <ul className="plain-list">
                  {desksOf(ctx.actor, frame.panelCall).map((desk) => (
                    <li key={desk.href} className="border-b border-rule py-2.5">
                      <TextLink href={desk.href}>{desk.label}</TextLink>
                    </li>
                  ))}
                </ul>
              </section>
              <SessionList
                sessions={sessions.map((line) => ({
                  ...line,
                  createdAt: line.createdAt.toISOString(),
                  lastSeenAt: line.lastSeenAt.toISOString(),
                }))}
                action={endOtherSessionsAction}
              />
            </>
          }
        >
          <section className="max-w-lg">
            <SectionHeading title="About you" />
            <ProfileForm profile={profile} zones={zones} action={saveProfileAction} />
          </section>
          <section className="mt-10 max-w-lg">
            <SectionHeading title="Password" />
            <ChangePasswordForm action={changePasswordAction} />
          </section>
          <section className="mt-10 max-w-prose" id="personal-data">
            <SectionHeading title="What is held about you" />
            <OwnData
              email={account.email}
              askedAt={erasureAskedAt?.toISOString() ?? null}
              erasure={erasure}
              action={askForErasureAction}
            />
          </section>
        </TwoColumns>
      </div>
    </Main>
  )
}
