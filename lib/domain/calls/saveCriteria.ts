import type { z } from 'zod'
import { sentSizes, writeCriteria } from '@/db/queries/callRules'
import { callCriteria } from '@/db/queries/calls'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { rulesChangeOf } from './rulesChange'
import type { saveCriteriaSchema } from './rulesSchema'
import type { CallCriterion } from './types'

const logged = (criteria: readonly Pick<CallCriterion, 'title' | 'prompt' | 'weight'>[]) => ({
  criteria: criteria.map(({ title, prompt, weight }) => `${title} (${weight}): ${prompt}`),
})

/** Says what proposals are judged by, and with what weights, until the first proposal has been sent under it. */
export function saveCriteria(ctx: ActingContext, input: z.output<typeof saveCriteriaSchema>): Promise<void> {
  return changeCall(ctx, {
    action: 'call.criteria',
    slug: input.slug,
    version: input.version,
    decide: rulesChangeOf,
    then: async (tx, call) => {
      const sent = (await sentSizes(tx.db, call.id)).length
      if (sent > 0)
        throw refuse.closed(
          `The criteria stay: ${countInWords(sent, 'proposal has', 'proposals have')} been sent under them.`,
        )
      const names = input.criteria.map(({ title }) => title.toLowerCase())
      const twice = names.findIndex((name, index) => names.indexOf(name) !== index)
      if (twice >= 0)
        throw refuse.field(`criteria.${twice}.title`, 'There is a criterion of this name already.')
      const before = await callCriteria(tx.db, call.id)
      await writeCriteria(tx.db, call.id, input.criteria)
      return { before: logged(before), after: logged(input.criteria) }
    },
  })
}
