import { decidedProposals, outcomesByKind } from '@/db/queries/callOutcomes'
import { findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { standingAwards } from '@/db/queries/decisions'
import { offeredTime, requestLines } from '@/db/queries/panel'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { holds } from '../actor'
import { mayReadCall } from '../calls/policy'
import { callPhase } from '../calls/rules'
import type { Context } from '../context'
import { leastCount, suppressSmall } from './suppressSmall'

export interface OutcomeCounts {
  kind: string
  /** Null where the count is kept back. */
  awarded: number | null
  reserve: number | null
  declined: number | null
  all: number | null
}

export interface TelescopeHours {
  telescope: string
  offeredSeconds: number
  /** Null where too few proposals ask for the telescope. */
  askedSeconds: number | null
  givenSeconds: number | null
}

export interface CallStatistics {
  /** The last row counts all kinds. */
  counts: OutcomeCounts[]
  hours: TelescopeHours[]
  /** Small counts are kept back: the reader is not of the office. */
  isPublic: boolean
}

const outcomes = ['awarded', 'reserve', 'declined'] as const

/**
 * How a call came out, once all of it is made known; null before. To everyone but the office small counts are kept
 * back, and as many others that no sum gives one away.
 */
export async function readCallStatistics(ctx: Context, slug: string): Promise<CallStatistics | null> {
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  authorize(mayReadCall(ctx.actor, call))
  const phase = callPhase(call, await databaseNow(ctx.db))
  if (phase !== 'decided' && phase !== 'archived') return null
  const isPublic = !holds(ctx.actor, 'office')
  const least = isPublic ? leastCount : 0
  const ids = await decidedProposals(ctx.db, call.id)
  const [found, asked, given, blocks] = await Promise.all([
    outcomesByKind(ctx.db, call.id),
    requestLines(ctx.db, ids),
    standingAwards(ctx.db, ids),
    offeredTime(ctx.db, call.id),
  ])
  const kinds = [...new Set(found.map(({ kind }) => kind))]
  const cells = suppressSmall(
    kinds.map((kind) =>
      outcomes.map((state) => found.find((one) => one.kind === kind && one.state === state)?.proposals ?? 0),
    ),
    least,
  )
  const telescopes = [...new Map(blocks.map(({ telescopeId, telescope }) => [telescopeId, telescope]))]
  return {
    counts:
      kinds.length === 0
        ? []
        : [...kinds, 'All kinds'].map((kind, index) => {
            const [awarded = null, reserve = null, declined = null, all = null] = cells[index] ?? []
            return { kind, awarded, reserve, declined, all }
          }),
    hours: telescopes.map(([id, telescope]) => {
      const lines = asked.filter((line) => line.telescopeId === id)
      const awards = given.filter((line) => line.telescopeId === id && !line.isReserve)
      const isShown = new Set(lines.map(({ proposalId }) => proposalId)).size >= least
      const isGivenShown = isShown && new Set(awards.map(({ proposalId }) => proposalId)).size >= least
      const seconds = (all: readonly { seconds: number }[]) => all.reduce((sum, one) => sum + one.seconds, 0)
      return {
        telescope,
        offeredSeconds: seconds(blocks.filter((block) => block.telescopeId === id)),
        askedSeconds: isShown ? lines.reduce((sum, line) => sum + line.askedSeconds, 0) : null,
        givenSeconds: isGivenShown ? seconds(awards) : null,
      }
    }),
    isPublic,
  }
}
