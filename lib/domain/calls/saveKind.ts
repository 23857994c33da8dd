import type { z } from 'zod'
import { callKinds } from '@/db/queries/calls'
import { callPanels } from '@/db/queries/callPanels'
import { insertKind, proposalsAwaiting, sentSizes, updateKind, type KindChange } from '@/db/queries/callRules'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { kindProblems } from './kindProblems'
import { rulesChangeOf } from './rulesChange'
import type { saveKindSchema } from './rulesSchema'
import { tellOfDeadline } from './tellOfDeadline'
import type { CallKind } from './types'

type Input = z.output<typeof saveKindSchema>

const rowOf = (input: Input): KindChange => ({
  kind: input.kind,
  title: input.title,
  closes_at: input.closesAt,
  page_limit: input.pageLimit,
  word_limit: input.wordLimit,
  figure_limit: input.figureLimit,
  abstract_limit: input.abstractLimit,
  max_seconds: input.maxHours === null ? null : Math.round(input.maxHours * 3600),
  panel_id: input.panelId,
  needs_student: input.needsStudent ? 1 : 0,
  target_limit: input.targetLimit,
  takes_awaited: input.takesAwaited ? 1 : 0,
  needs_cadence: input.needsCadence ? 1 : 0,
  needs_last_night: input.needsLastNight ? 1 : 0,
})

const logged = (kind: CallKind) => ({
  kind: kind.kind,
  title: kind.title,
  closesAt: kind.closesAt,
  pageLimit: kind.pageLimit,
  wordLimit: kind.wordLimit,
  figureLimit: kind.figureLimit,
  abstractLimit: kind.abstractLimit,
  maxSeconds: kind.maxSeconds,
  panelId: kind.panelId,
  needsStudent: kind.needsStudent,
  targetLimit: kind.targetLimit,
  takesAwaited: kind.takesAwaited,
  needsCadence: kind.needsCadence,
  needsLastNight: kind.needsLastNight,
})

/**
 * Adds a kind of proposal to a call, or changes its limits, its panel and its own deadline. What would break
 * proposals already sent is refused, saying how many; a deadline that moves is told to those with a draft.
 */
export function saveKind(ctx: ActingContext, input: Input): Promise<void> {
  return changeCall(ctx, {
    action: input.kindId === null ? 'call.add-kind' : 'call.kind',
    slug: input.slug,
    version: input.version,
    decide: rulesChangeOf,
    then: async (tx, call, _, now) => {
      const [kinds, panels, sent] = await Promise.all([
        callKinds(tx.db, call.id),
        callPanels(tx.db, call.id),
        sentSizes(tx.db, call.id),
      ])
      const was = kinds.find(({ id }) => id === input.kindId) ?? null
      if (input.kindId !== null && !was) throw refuse.notFound('kind of proposal')
      const awaiting = was ? await proposalsAwaiting(tx.db, was.id) : 0
      const problems = kindProblems(input, { was, kinds, panels, sent, awaiting, call, now })
      if (Object.keys(problems).length > 0) throw refuse.invalid('Something here needs mending.', problems)
      const id = was?.id ?? (await insertKind(tx.db, call.id, rowOf(input)))
      if (was) await updateKind(tx.db, id, rowOf(input))
      const closesAt = input.closesAt ?? call.closes_at
      const isMoved =
        was && call.stage !== 'planned' && (was.closesAt ?? call.closes_at).getTime() !== closesAt.getTime()
      const why = `It holds for “${input.title}”.`
      if (isMoved) await tellOfDeadline(tx, call, { closesAt, why }, { notice: 'kind-deadline', kindId: id })
      const after = (await callKinds(tx.db, call.id)).find((kind) => kind.id === id)
      return { ...(was ? { before: logged(was) } : {}), ...(after ? { after: logged(after) } : {}) }
    },
  })
}
