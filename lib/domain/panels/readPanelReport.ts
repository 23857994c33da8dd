import { assessmentsOfProposals } from '@/db/queries/assessments'
import { readSnapshot } from '@/db/queries/versions'
import { refuse } from '@/lib/errors'
import type { InstrumentAssessment } from '../assessments/types'
import type { ActingContext } from '../context'
import { anonymise, type AnonymousProposal } from '../packets/anonymise'
import { ledProposal } from './ledProposal'

/** The report a proposal was sent with, without names, for whoever leads the panel and has no interest in it. */
export async function readPanelReport(
  ctx: ActingContext,
  key: { callSlug: string; reviewNumber: string },
): Promise<{ proposal: AnonymousProposal; assessments: InstrumentAssessment[] }> {
  const { id } = await ledProposal(ctx, key)
  const [sent, assessments] = await Promise.all([
    readSnapshot(ctx.db, id),
    assessmentsOfProposals(ctx.db, [id], true),
  ])
  if (!sent) throw refuse.notFound('report')
  return { proposal: { ...anonymise(sent.snapshot), reviewNumber: key.reviewNumber }, assessments }
}
