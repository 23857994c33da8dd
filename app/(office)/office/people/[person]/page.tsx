import type { Metadata } from 'next'
import { GrantRoleForm } from '@/components/office/GrantRoleForm'
import { PersonData } from '@/components/office/PersonData'
import { PersonFacts } from '@/components/office/PersonFacts'
import { PersonStanding } from '@/components/office/PersonStanding'
import { RolesOfPerson } from '@/components/office/RolesOfPerson'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readInviteChoices } from '@/lib/domain/invitations/readInviteChoices'
import { readErasure } from '@/lib/domain/people/readErasure'
import { readOfficePerson } from '@/lib/domain/people/readOfficePerson'
import { paths } from '@/lib/paths'
import { endRoleAction, erasePersonAction, grantRoleAction } from './actions'

export const metadata: Metadata = { title: 'Person' }

export default async function OfficePersonPage({ params }: { params: Promise<{ person: string }> }) {
  const ctx = await openPage('/office/people/[person]')
  const { person: id } = await params
  const person = await orNotFound(readOfficePerson(ctx, /^\d{1,9}$/.test(id) ? Number(id) : 0))
  const [choices, erasure] = await Promise.all([readInviteChoices(ctx), readErasure(ctx, person.id)])
  const isGone = Boolean(person.mergedInto ?? person.erasedAt)
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'People', href: paths.office('people') }, { label: person.name }]} />
      <PageTitle title={person.name} lead={person.institute} />
      <PersonStanding person={person} />
      <section className="mt-8">
        <SectionHeading title="Roles" />
        <div className="mt-4">
          <RolesOfPerson grants={person.grants} end={endRoleAction} />
        </div>
      </section>
      <div className="mt-12">
        <TwoColumns side={<PersonFacts person={person} />}>
          {isGone ? null : (
            <section className="max-w-lg">
              <SectionHeading title="Give a role" />
              <p className="mt-2 mb-6 text-muted">It holds as soon as you give it, and a letter says so.</p>
              <GrantRoleForm personId={person.id} name={person.name} action={grantRoleAction} {...choices} />
            </section>
          )}
          {person.erasedAt ? null : (
            <section className="mt-12 max-w-prose" id="personal-data">
              <SectionHeading title="Personal data" />
              <PersonData
                personId={person.id}
                email={person.email}
                isOwn={person.id === ctx.actor.personId}
                erasure={erasure}
                erase={erasePersonAction}
              />
            </section>
          )}
        </TwoColumns>
      </div>
    </Main>
  )
}
