import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { cosmologyPresets } from '@/lib/science/cosmology'
import type { ActingContext } from '../context'
import { computeProposal } from '../observations/computeProposal'
import type { Recomputation } from './recomputationSchema'
import { canOpenReview } from './policy'
import { reviewFacts } from './reviewFacts'

/** The frozen request computed anew under another cosmology; nothing is stored and the packet stays as it is. */
export async function recomputeReview(
  ctx: ActingContext,
  assignmentId: number,
  cosmologyId: string,
): Promise<Recomputation> {
  const preset = cosmologyPresets.find(({ id }) => id === cosmologyId)
  if (!preset) throw refuse.field('cosmology', 'There is no such cosmology here.')
  const facts = await reviewFacts(ctx, assignmentId, false)
  authorize(canOpenReview(ctx.actor, facts))
  const version = await readSnapshot(ctx.db, facts.assignment.proposalId)
  if (!version) throw refuse.notFound('review')
  const { contents, computation } = version.snapshot
  const again = computeProposal({
    ...contents,
    cosmology: {
      id: preset.id,
      parameters: { ...preset.parameters, mNuEv: [...preset.parameters.mNuEv] },
      comparisonId: null,
    },
  })
  const before = new Map(computation.observations.map((row) => [row.observationId, row.verdict]))
  return {
    cosmologyName: again.cosmologyName,
    stated: {
      cosmologyName: computation.cosmologyName,
      neededSeconds: computation.neededSeconds,
      verdict: computation.verdict,
    },
    neededSeconds: again.neededSeconds,
    verdict: again.verdict,
    flips: again.observations.filter((row) => before.get(row.observationId) !== row.verdict).length,
    targets: contents.targets.length,
  }
}
