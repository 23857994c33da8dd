'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { addInvestigator } from '@/lib/domain/proposals/addInvestigator'
import { confirmMembership } from '@/lib/domain/proposals/confirmMembership'
import { leaveProposal } from '@/lib/domain/proposals/leaveProposal'
import { moveInvestigator } from '@/lib/domain/proposals/moveInvestigator'
import {
  accessSchema,
  addInvestigatorSchema,
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
