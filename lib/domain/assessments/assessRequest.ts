import { standingAssessments, supersedeAssessment } from '@/db/queries/assessments'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { canAssess } from './policy'
import { requestFacts } from './requestFacts'
import { countedSeconds, hoursProblem, targetHours } from './rules'
import type { AssessRequestInput } from './schema'

/** Says accept, change or not possible over the computed verdict; an earlier assessment is superseded and kept. */
export function assessRequest(
  ctx: ActingContext,
  input: AssessRequestInput,
): Promise<{ assessmentId: number }> {
  return inTransaction(ctx, async (tx) => {
    const facts = await requestFacts(tx, input.requestId, true)
    authorize(canAssess(tx.actor, facts))
    const version = await readSnapshot(tx.db, facts.request.proposalId)
    if (!version) throw refuse.notFound('request')
    const { contents, computation } = version.snapshot
    const parts = { ...contents, computed: computation.observations }
    const asked = countedSeconds(targetHours(parts, facts.instrumentId), 'askedSeconds')
    const problem = hoursProblem(input.verdict, input.trueHours, asked)
    if (problem) throw refuse.field('trueHours', problem)

    const before = (await standingAssessments(tx.db, [input.requestId])).get(input.requestId) ?? null
    if ((before?.id ?? null) !== input.over)
      throw refuse.stale({
        changedBy: 'Another assessor of this instrument',
        changedAt: (before?.assessedAt ?? facts.now).toISOString(),
        version: before?.id ?? 0,
        theirs: { verdict: before?.verdict, trueSeconds: before?.trueSeconds, reason: before?.reason },
      })
    const assessmentId = await supersedeAssessment(tx.db, {
      requestId: input.requestId,
      verdict: input.verdict,
      trueSeconds: input.trueHours,
      reason: input.reason,
      panelNote: input.panelNote,
      personId: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'assessRequest',
      actingAs: 'instrument-scientist',
      subject: { kind: 'assessment request', id: input.requestId },
      before: before && { verdict: before.verdict, trueSeconds: before.trueSeconds },
      after: { verdict: input.verdict, trueSeconds: input.trueHours },
    })
    return { assessmentId }
  })
}
