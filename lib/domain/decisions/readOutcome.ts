import { halvesOfProposal } from '@/db/queries/visits'
import { panelTexts } from '@/db/queries/panelTexts'
import { standingAwards, standingDecisions, type StandingAward } from '@/db/queries/decisions'
import { assessedLines, requestLines } from '@/db/queries/panel'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { withEvenings } from '../visits/withEvenings'
import { mayReadProposal } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import type { ProposalState } from '../proposals/types'
import type { Outcome } from './rules'

export interface OutcomeView {
  id: number
  reference: string
  title: string
  callNumber: number
  callSlug: string
  state: ProposalState
  /** When letters go out, while nothing is made known. */
  lettersAt: Date
  decision: {
    outcome: Outcome
    releasedAt: Date
    statement: string
    /** Each with the nights of its visit in words; empty in the queue. */
    lines: (StandingAward & { evenings: string })[]
    askedSeconds: number
    /**
     * Comments of the reviewers, unsigned and in no order that tells who wrote them; without those that were withheld,
     * and those the statement holds word for word.
     */
    comments: string[]
    assessments: {
      instrument: string
      verdict: 'accepted' | 'change' | 'not-possible'
      reason: string
      trueSeconds: number
    }[]
  } | null
}

/** What the investigators read of the decision: nothing of it before it is made known. */
export async function readOutcome(ctx: ActingContext, reference: string): Promise<OutcomeView> {
  const contents = await readContents(ctx.db, reference)
  authorize(mayReadProposal(ctx.actor, contents))
  const { id, call } = contents
  const decision = (await standingDecisions(ctx.db, [id])).get(id)
  const base = {
    id,
    reference: contents.reference,
    title: contents.title,
    callNumber: call.number,
    callSlug: call.slug,
    state: contents.state,
    lettersAt: call.lettersAt,
  }
  if (!decision?.released_at) return { ...base, decision: null }
  const [lines, halves, asked, assessed, texts] = await Promise.all([
    standingAwards(ctx.db, [id]),
    halvesOfProposal(ctx.db, id),
    requestLines(ctx.db, [id]),
    assessedLines(ctx.db, [id]),
    panelTexts(ctx.db, [id]),
  ])
  return {
    ...base,
    decision: {
      outcome: decision.outcome,
      releasedAt: decision.released_at,
      statement: decision.statement,
      lines: withEvenings(lines, halves),
      askedSeconds: asked.reduce((sum, line) => sum + line.askedSeconds, 0),
      comments: texts
        .filter((text) => text.audience === 'investigators' && text.withheldReason === null)
        .map((text) => text.body)
        .filter((body) => !decision.statement.includes(body.trim()))
        .sort((a, b) => a.localeCompare(b, 'en-GB')),
      assessments: assessed.map((one) => ({
        instrument: asked.find((line) => line.instrumentId === one.instrumentId)?.instrument ?? '',
        verdict: one.verdict,
        reason: one.reason,
        trueSeconds: one.trueSeconds,
      })),
    },
  }
}
