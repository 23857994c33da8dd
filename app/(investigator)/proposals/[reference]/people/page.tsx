import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { AddPersonForm } from '@/components/proposals/AddPersonForm'
import { OwnMembership } from '@/components/proposals/OwnMembership'
import { PeopleList } from '@/components/proposals/PeopleList'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { mayLeave } from '@/lib/domain/proposals/policy'
import { markSectionDoneAction } from '../actions'
import { proposalOf } from '../proposalOf'
import {
  addInvestigatorAction,
  confirmMembershipAction,
  leaveProposalAction,
  moveInvestigatorAction,
  removeInvestigatorAction,
  setAccessAction,
} from './actions'

export const metadata: Metadata = { title: 'People' }

const manage = { remove: removeInvestigatorAction, setAccess: setAccessAction, move: moveInvestigatorAction }

export default async function PeoplePage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/people')
  const { contents, own, readOnly, mayManage } = await orNotFound(proposalOf((await params).reference))
  const { reference, people } = contents
  const lead = people.find(({ role }) => role === 'pi')?.name ?? 'The principal investigator'
  return (
    <Main>
      <PageTitle
        title="People"
        lead="Who asks, in the order of names. Reviewers never see them; the office and the letters do."
      />
      <div className="mt-6">
        <ReadOnlyNote reason={readOnly} />
        {own && own.role !== 'pi' && !own.confirmedAt ? (
          <OwnMembership
            reference={reference}
            lead={lead}
            hasAgreed={false}
            mayLeave={mayLeave(ctx.actor, contents).allowed}
            agree={confirmMembershipAction}
            leave={leaveProposalAction}
          />
        ) : null}
        <TwoColumns
          side={mayManage ? <AddPersonForm reference={reference} add={addInvestigatorAction} /> : null}
        >
          <PeopleList reference={reference} people={people} actions={mayManage ? manage : null} />
          {own?.confirmedAt && own.role !== 'pi' ? (
            <OwnMembership
              reference={reference}
              lead={lead}
              hasAgreed
              mayLeave={mayLeave(ctx.actor, contents).allowed}
              agree={confirmMembershipAction}
              leave={leaveProposalAction}
            />
          ) : null}
        </TwoColumns>
      </div>
      <SectionFoot
        reference={reference}
        section="people"
        done={contents.sectionsDone.includes('people')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
