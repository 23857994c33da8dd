'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { askForInvoice as askForInvoiceVerb } from '@/lib/domain/fees/askForInvoice'
import { askForWaiver as askForWaiverVerb } from '@/lib/domain/fees/askForWaiver'
import { askForInvoiceSchema, askForWaiverSchema, startPaymentSchema } from '@/lib/domain/fees/schema'
import { startPayment as startPaymentVerb } from '@/lib/domain/fees/startPayment'
import { reopenProposal as reopenVerb } from '@/lib/domain/submission/reopenProposal'
import { reopenSchema, withdrawSchema } from '@/lib/domain/submission/schema'
import { withdrawProposal as withdrawVerb } from '@/lib/domain/submission/withdrawProposal'
import { paths } from '@/lib/paths'

const pagesOf = (reference: string) => [
  paths.proposals(),
  paths.proposal(reference),
  paths.proposalSent(reference),
]

export const startPayment = defineAction({
  name: 'startPayment',
  schema: startPaymentSchema,
  run: (ctx, input) => startPaymentVerb(ctx, input),
  limit: { points: 20, seconds: 600 },
  redirectTo: ({ url }) => url,
})

export const askForWaiver = defineAction({
  name: 'askForWaiver',
  schema: askForWaiverSchema,
  run: (ctx, input) => askForWaiverVerb(ctx, input),
  revalidate: (_, { reference }) => pagesOf(reference),
})

export const askForInvoice = defineAction({
  name: 'askForInvoice',
  schema: askForInvoiceSchema,
  run: (ctx, input) => askForInvoiceVerb(ctx, input),
  revalidate: (_, { reference }) => pagesOf(reference),
  limit: { points: 10, seconds: 600 },
})

export const reopenProposal = defineAction({
  name: 'reopenProposal',
  schema: reopenSchema,
  run: (ctx, input, arrivedAt) => reopenVerb(ctx, { ...input, arrivedAt }),
  revalidate: (_, { reference }) => pagesOf(reference),
  redirectTo: (_, { reference }) => paths.proposal(reference),
})

export const withdrawProposal = defineAction({
  name: 'withdrawProposal',
  schema: withdrawSchema,
  run: (ctx, input, arrivedAt) => withdrawVerb(ctx, { ...input, arrivedAt }),
  revalidate: (_, { reference }) => pagesOf(reference),
})
