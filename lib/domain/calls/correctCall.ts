import type { z } from 'zod'
import { insertCorrection } from '@/db/queries/corrections'
import { whoIsTold } from '@/db/queries/whoIsTold'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { callCorrected } from '../outbox/letters/callCorrected'
import { queueLetter } from '../outbox/queueLetter'
import { changeCall } from './changeCall'
import type { correctCallSchema } from './correctionSchema'

/**
 * Puts a dated correction on a published call. It stands on the call's page and over every draft, and while proposals
 * can be sent or reopened everyone named on one gets a letter, once.
 */
export function correctCall(ctx: ActingContext, input: z.output<typeof correctCallSchema>): Promise<void> {
  const { slug, version, concerns, body } = input
  let isOpen = false
  return changeCall(ctx, {
    action: 'call.correct',
    slug,
    version,
    decide: (row, now) => {
      if (row.stage === 'planned')
        throw refuse.closed('Nobody has read this call yet: change what is wrong instead.')
      isOpen = row.stage === 'published' && now < row.closes_at
      return {}
    },
    then: async (tx, call) => {
      const id = await insertCorrection(tx.db, { callId: call.id, concerns, body, madeBy: tx.actor.personId })
      const people = isOpen ? await whoIsTold(tx.db, call.id, { notice: 'correction' }) : []
      const letter = (name: string) =>
        callCorrected({ name, callNumber: call.number, concerns, body }, tx.request.origin + paths.call(slug))
      for (const person of people)
        await queueLetter(tx, person, letter(person.name), `correction:${call.id}:${id}`)
      return { after: { concerns, body, told: people.length } }
    },
  })
}
