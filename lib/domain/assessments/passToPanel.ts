import { passRequests, standingAssessments } from '@/db/queries/assessments'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canAssess } from './policy'
import { requestFacts } from './requestFacts'
import type { PassToPanelInput } from './schema'
import { visibleRequests } from './visibleRequests'

/** Passes an instrument's assessments of a call to the panel, all at once; every request must be assessed. */
export function passToPanel(ctx: ActingContext, input: PassToPanelInput): Promise<{ passed: number }> {
  return inTransaction(ctx, async (tx) => {
    const requests = (await visibleRequests(tx)).filter(
      ({ request, call }) => request.instrumentId === input.instrumentId && call.number === input.callNumber,
    )
    const first = requests[0]
    if (!first) throw refuse.notFound('instrument')
    authorize(canAssess(tx.actor, await requestFacts(tx, first.request.id, true)))
    const ids = requests.map(({ request }) => request.id)
    const assessed = await standingAssessments(tx.db, ids)
    const open = ids.filter((id) => !assessed.has(id)).length
    if (open > 0)
      throw refuse.invalid(`${countInWords(open, 'request is', 'requests are', true)} not assessed yet.`)
    await passRequests(tx.db, ids)
    await writeLogbook(tx, {
      action: 'passToPanel',
      actingAs: 'instrument-scientist',
      subject: { kind: 'instrument', id: input.instrumentId },
      after: { call: input.callNumber, requests: ids },
    })
    return { passed: ids.length }
  })
}
