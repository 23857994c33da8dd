import { z } from 'zod'
import type { PaymentNoticeRow } from '@/db/queries/feeEvents'
import type { FeeEvent } from './feeEvents'

const refusedPayload = z.object({
  data: z.object({ object: z.object({ last_payment_error: z.object({ message: z.string() }) }) }),
})

/** Why the bank refused, as the firm wrote it; null where the notice does not say. */
function reasonIn(payload: string): string | null {
  try {
    const read = refusedPayload.safeParse(JSON.parse(payload))
    return read.success ? read.data.data.object.last_payment_error.message : null
  } catch {
    return null
  }
}

/** A notice of the firm as an event of a fee; null where another source tells of it better. */
export function noticeEvent(notice: PaymentNoticeRow): FeeEvent | null {
  const event = (words: string, tone: FeeEvent['tone'] = 'plain'): FeeEvent => ({
    at: notice.at,
    words,
    who: null,
    tone,
  })
  switch (notice.type) {
    case 'payment_intent.payment_failed': {
      const reason = reasonIn(notice.payload)
      return event(reason ? `Card refused by the bank: ${reason}` : 'Card refused by the bank', 'refused')
    }
    case 'payment_intent.requires_action':
      return event('The bank asked for a confirmation')
    case 'checkout.session.expired':
      return event('The firm’s page ran out unpaid', 'refused')
    case 'checkout.session.completed':
      return event('Notice from the firm, signature checked')
    default:
      return null
  }
}
