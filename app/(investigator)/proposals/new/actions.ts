'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { beginProposal } from '@/lib/domain/proposals/beginProposal'
import { beginSchema } from '@/lib/domain/proposals/schema'
import { paths } from '@/lib/paths'

export const beginProposalAction = defineAction({
  name: 'beginProposal',
  schema: beginSchema,
  run: beginProposal,
  revalidate: () => paths.proposals(),
  redirectTo: ({ reference }) => paths.proposal(reference),
  limit: { points: 30, seconds: 3600 },
})
