import { createHash } from 'node:crypto'
import { boundedMap } from '../observations/boundedMap'
import { computeProposal } from '../observations/computeProposal'
import type { ProposalComputation } from '../observations/types'
import type { ProposalContents } from './types'

const kept = boundedMap<ProposalComputation>(200)

/** Only what is computed from: a new title or a new paper leaves every number as it is. */
function keyOf(c: ProposalContents): string {
  const season = [c.call.seasonFrom, c.call.seasonTo]
  const inputs = [
    c.cosmology,
    season,
    c.site,
    c.modes,
    c.groups,
    c.targets,
    c.constraintSets,
    c.observations,
    c.kind.maxSeconds,
  ]
  return createHash('sha256').update(JSON.stringify(inputs)).digest('hex')
}

/** The computation of these contents, made once for each state of them and kept in memory. */
export function computationOf(contents: ProposalContents): ProposalComputation {
  return kept.getOr(keyOf(contents), () => computeProposal(contents))
}
