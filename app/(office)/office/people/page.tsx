import type { Metadata } from 'next'
import { InviteForm } from '@/components/office/InviteForm'
import { PeopleTable } from '@/components/office/PeopleTable'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readInviteChoices } from '@/lib/domain/invitations/readInviteChoices'
import { readOfficePeople } from '@/lib/domain/people/readOfficePeople'
import { disablePersonAction, enablePersonAction, inviteAction, takeBackInvitationAction } from './actions'

export const metadata: Metadata = { title: 'People' }

export default async function OfficePeoplePage() {
  const ctx = await openPage('/office/people')
  const [people, choices] = await Promise.all([readOfficePeople(ctx), readInviteChoices(ctx)])
  return (
    <Main>
      <PageTitle title="People" lead="Everyone with an account, and the roles they hold now." />
      <div className="mt-6">
        <PeopleTable
          initial={people}
          ownId={ctx.actor.personId}
          disable={disablePersonAction}
          enable={enablePersonAction}
          takeBack={takeBackInvitationAction}
        />
      </div>
      <section className="mt-12 max-w-lg" id="invite">
        <SectionHeading title="Invite somebody" />
        <p className="mt-2 mb-6 text-muted">
          A letter with a link goes out; the role begins when it is accepted. An address that has an account
          gets the role at once, and a letter that says so.
        </p>
        <InviteForm action={inviteAction} {...choices} />
      </section>
    </Main>
  )
}
