'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { continueProposal } from '@/lib/domain/continuation/continueProposal'
import { continueSchema } from '@/lib/domain/continuation/schema'
import { paths } from '@/lib/paths'

export const continueProposalAction = defineAction({
  name: 'continueProposal',
  schema: continueSchema,
  run: continueProposal,
  revalidate: () => paths.proposals(),
  redirectTo: ({ reference }) => paths.proposal(reference),
  // Each may write a letter to everyone named.
  limit: { points: 20, seconds: 3600 },
})
