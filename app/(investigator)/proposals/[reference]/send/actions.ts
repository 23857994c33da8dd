'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { sendSchema } from '@/lib/domain/submission/schema'
import { sendAndSettle } from '@/lib/domain/submission/sendAndSettle'
import { paths } from '@/lib/paths'

export const sendProposal = defineAction({
  name: 'sendProposal',
  schema: sendSchema,
  run: (ctx, input, arrivedAt) => sendAndSettle(ctx, { ...input, arrivedAt }),
  revalidate: (_, { reference }) => [paths.proposals(), paths.proposal(reference)],
  redirectTo: ({ goTo }) => goTo,
})
