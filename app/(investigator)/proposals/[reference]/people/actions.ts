'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { acceptLead } from '@/lib/domain/proposals/acceptLead'
import { addInvestigator } from '@/lib/domain/proposals/addInvestigator'
import { confirmMembership } from '@/lib/domain/proposals/confirmMembership'
import { describeInvestigator } from '@/lib/domain/proposals/describeInvestigator'
import { endLeadOffer } from '@/lib/domain/proposals/endLeadOffer'
import { leaveProposal } from '@/lib/domain/proposals/leaveProposal'
import { moveInvestigator } from '@/lib/domain/proposals/moveInvestigator'
import { offerLead } from '@/lib/domain/proposals/offerLead'
import {
  accessSchema,
  addInvestigatorSchema,
  describeInvestigatorSchema,
  investigatorSchema,
  moveSchema,
} from '@/lib/domain/proposals/peopleSchema'
import { removeInvestigator } from '@/lib/domain/proposals/removeInvestigator'
import { referenceSchema } from '@/lib/domain/proposals/schema'
import { setAccess } from '@/lib/domain/proposals/setAccess'
import { paths } from '@/lib/paths'

const page = (_: unknown, { reference }: { reference: string }) => paths.proposalSection(reference, 'people')

export const addInvestigatorAction = defineAction({
  name: 'addInvestigator',
  schema: addInvestigatorSchema,
  run: addInvestigator,
  revalidate: page,
  // Each writes a letter to someone.
  limit: { points: 60, seconds: 3600 },
})

export const removeInvestigatorAction = defineAction({
  name: 'removeInvestigator',
  schema: investigatorSchema,
  run: removeInvestigator,
  revalidate: page,
})

export const setAccessAction = defineAction({
  name: 'setAccess',
  schema: accessSchema,
  run: setAccess,
  revalidate: page,
})

export const moveInvestigatorAction = defineAction({
  name: 'moveInvestigator',
  schema: moveSchema,
  run: moveInvestigator,
  revalidate: page,
})

export const describeInvestigatorAction = defineAction({
  name: 'describeInvestigator',
  schema: describeInvestigatorSchema,
  run: describeInvestigator,
  revalidate: page,
})

export const offerLeadAction = defineAction({
  name: 'offerLead',
  schema: investigatorSchema,
  run: offerLead,
  revalidate: page,
  // Each writes a letter to someone.
  limit: { points: 20, seconds: 3600 },
})

export const acceptLeadAction = defineAction({
  name: 'acceptLead',
  schema: referenceSchema,
  run: acceptLead,
  revalidate: page,
})

export const endLeadOfferAction = defineAction({
  name: 'endLeadOffer',
  schema: referenceSchema,
  run: endLeadOffer,
  revalidate: page,
})

export const confirmMembershipAction = defineAction({
  name: 'confirmMembership',
  schema: referenceSchema,
  run: confirmMembership,
  revalidate: page,
})

export const leaveProposalAction = defineAction({
  name: 'leaveProposal',
  schema: referenceSchema,
  run: leaveProposal,
  redirectTo: () => paths.proposals(),
})
