import type { z } from 'zod'
import { callKinds } from '@/db/queries/calls'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { newDatesOf } from './changes'
import { kindOutOfDates } from './kindOutOfDates'
import type { saveDatesSchema } from './schema'
import { tellOfDeadline } from './tellOfDeadline'

/** Saves the dates of a call; a moved deadline is told, with the reason, to everyone with a draft it holds for. */
export function saveDates(ctx: ActingContext, input: z.output<typeof saveDatesSchema>): Promise<void> {
  const { closesAt, why } = input
  return changeCall(ctx, {
    action: 'call.dates',
    slug: input.slug,
    version: input.version,
    decide: (row, now) => {
      const change = newDatesOf(row, input, now)
      const isMoved = row.stage !== 'planned' && row.closes_at.getTime() !== closesAt.getTime()
      if (isMoved && why === '')
        throw refuse.field('why', 'Say why the deadline moves: everyone with a draft is told.')
      return change
    },
    then: async (tx, before) => {
      const odd = kindOutOfDates(await callKinds(tx.db, before.id), input)
      if (odd) throw refuse.field(odd.field, odd.sentence)
      if (before.stage === 'planned' || before.closes_at.getTime() === closesAt.getTime()) return
      const told = await tellOfDeadline(tx, before, { closesAt, why }, { notice: 'deadline' })
      return { after: { why, told } }
    },
  })
}
