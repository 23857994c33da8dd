import { assessmentsOfProposals } from '@/db/queries/assessments'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { InstrumentAssessment } from '../assessments/types'
import type { Call } from '../calls/types'
import type { ActingContext } from '../context'
import { anonymise, type AnonymousProposal } from '../packets/anonymise'
import { canOpenReview, canReopenReview, canSeeReview, canWriteReview } from './policy'
import { readReviewLines } from './readReviewLines'
import { readSheet, type Sheet } from './readSheet'
import { reviewFacts } from './reviewFacts'
import type { ReviewLine } from './types'

export interface ReviewDesk {
  assignmentId: number
  version: number
  finishedAt: Date | null
  declaredAt: Date | null
  now: Date
  call: Pick<Call, 'slug' | 'number' | 'reviewsDueAt' | 'panelMeetsAt'>
  proposal: AnonymousProposal
  assessments: (InstrumentAssessment & { panelNote: string })[]
  sheet: Sheet
  /** Why the sheet cannot be written on; null when it can. */
  shut: string | null
  mayReopen: boolean
  /** All own assignments of the call, for the strip. */
  lines: ReviewLine[]
}

/** One review, or where to declare interests first. What it carries is frozen and without identity. */
export async function readReviewDesk(
  ctx: ActingContext,
  assignmentId: number,
): Promise<ReviewDesk | { declareFirst: string }> {
  const facts = await reviewFacts(ctx, assignmentId, false)
  authorize(canSeeReview(ctx.actor, facts))
  if (!facts.hasDeclared) return { declareFirst: facts.call.slug }
  authorize(canOpenReview(ctx.actor, facts))
  const { assignment, call } = facts
  const writing = canWriteReview(ctx.actor, facts)
  const [version, assessments, sheet, calls] = await Promise.all([
    readSnapshot(ctx.db, assignment.proposalId),
    assessmentsOfProposals(ctx.db, [assignment.proposalId], true),
    readSheet(ctx.db, call.id, assignmentId),
    readReviewLines(ctx),
  ])
  if (!version) throw refuse.notFound('review')
  return {
    assignmentId,
    version: assignment.version,
    finishedAt: assignment.finishedAt,
    declaredAt: facts.declaredAt,
    now: facts.now,
    call: {
      slug: call.slug,
      number: call.number,
      reviewsDueAt: call.reviewsDueAt,
      panelMeetsAt: call.panelMeetsAt,
    },
    // The number is given when a proposal is sent, after its snapshot is taken.
    proposal: { ...anonymise(version.snapshot), reviewNumber: assignment.reviewNumber },
    assessments: assessments.map(
      ({ instrumentId, instrument, verdict, trueSeconds, reason, panelNote, assessedAt }) => ({
        instrumentId,
        instrument,
        verdict,
        trueSeconds,
        reason,
        panelNote,
        assessedAt,
      }),
    ),
    sheet,
    shut: writing.allowed ? null : writing.sentence,
    mayReopen: canReopenReview(ctx.actor, facts).allowed,
    lines: calls.find((group) => group.call.slug === call.slug)?.lines ?? [],
  }
}
