import type { z } from 'zod'
import { leadsOfDrafts } from '@/db/queries/office'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { deadlineMoved } from '../outbox/letters/deadlineMoved'
import { queueLetter } from '../outbox/queueLetter'
import { changeCall } from './changeCall'
import { newDatesOf } from './changes'
import type { saveDatesSchema } from './schema'

/** Saves the dates of a call; a moved deadline is told to everyone with a draft. */
export function saveDates(ctx: ActingContext, input: z.output<typeof saveDatesSchema>): Promise<void> {
  return changeCall(ctx, {
    action: 'call.dates',
    slug: input.slug,
    version: input.version,
    decide: (row, now) => newDatesOf(row, input, now),
    then: async (tx, before) => {
      if (before.stage === 'planned' || before.closes_at.getTime() === input.closesAt.getTime()) return
      for (const lead of await leadsOfDrafts(tx.db, before.id)) {
        const letter = deadlineMoved(
          lead,
          { number: before.number, closesAt: input.closesAt },
          tx.request.origin + paths.proposal(lead.reference),
        )
        const cause = `deadline:${before.id}:${input.closesAt.getTime()}:${lead.reference}`
        await queueLetter(tx, { personId: lead.person_id, email: lead.email, name: lead.name }, letter, cause)
      }
    },
  })
}
