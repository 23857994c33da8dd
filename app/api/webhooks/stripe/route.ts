import { applyNotice } from '@/lib/domain/fees/applyNotice'
import { defineRoute } from '@/lib/http/defineRoute'

/** Notices of the payment firm. Its signature is the only way in; a failure of ours makes it send again. */
export const POST = defineRoute({
  name: 'POST /api/webhooks/stripe',
  maxBytes: 500_000,
  run: (ctx, { request, text }) =>
    applyNotice(ctx, { body: text, signature: request.headers.get('stripe-signature') ?? '' }),
})
