import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { AddPersonForm } from '@/components/proposals/AddPersonForm'
import { LeadOffer } from '@/components/proposals/LeadOffer'
import { OwnMembership } from '@/components/proposals/OwnMembership'
import { PeopleList } from '@/components/proposals/PeopleList'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { mayLeave } from '@/lib/domain/proposals/policy'
import { markSectionDoneAction } from '../actions'
import { CarriedHere } from '../CarriedHere'
import { proposalOf } from '../proposalOf'
import {
  acceptLeadAction,
  addInvestigatorAction,
  confirmMembershipAction,
  describeInvestigatorAction,
  endLeadOfferAction,
  leaveProposalAction,
  moveInvestigatorAction,
  offerLeadAction,
  removeInvestigatorAction,
  setAccessAction,
} from './actions'

export const metadata: Metadata = { title: 'People' }

const manage = {
  remove: removeInvestigatorAction,
  setAccess: setAccessAction,
  describe: describeInvestigatorAction,
  move: moveInvestigatorAction,
}

export default async function PeoplePage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/people')
  const { contents, own, readOnly, mayManage, mayOfferLead, leadOfferedTo } = await orNotFound(
    proposalOf((await params).reference),
  )
  const { reference, people } = contents
  const lead = people.find(({ role }) => role === 'pi')?.name ?? 'The principal investigator'
  const asked = people.find(({ personId }) => personId !== null && personId === leadOfferedTo)
  return (
    <Main>
      <PageTitle
        title="People"
        lead="Who asks, in the order of names. Reviewers never see them; the office and the letters do."
      />
      <div className="mt-6">
        <ReadOnlyNote reason={readOnly} />
        <CarriedHere reference={reference} section="people" />
        {asked ? (
          <LeadOffer
            reference={reference}
            lead={lead}
            asked={asked.name}
            reader={asked === own ? 'asked' : mayOfferLead ? 'lead' : 'other'}
            accept={acceptLeadAction}
            end={endLeadOfferAction}
          />
        ) : null}
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
          <PeopleList
            reference={reference}
            people={people}
            actions={mayManage ? manage : null}
            offerLead={mayOfferLead && !asked ? offerLeadAction : null}
          />
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
