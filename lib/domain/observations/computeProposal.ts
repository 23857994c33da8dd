import type { ProposalContents } from '../proposals/types'
import { computeTarget } from './computeTarget'
import { comparisonOf, cosmologyOf } from './cosmologyOf'
import { engineVersion } from './engineVersion'
import { proposalVerdict } from './proposalVerdict'
import { recordVersions } from './recordVersions'
import { darkHours } from './seasonOf'
import type { ObservationComputation, ProposalComputation } from './types'

/**
 * Everything computed for a proposal: distances and hours of each target, exposure and checks of each observation,
 * and what the request comes to. Pure and the same on server and in the browser: same contents, same bytes.
 */
export function computeProposal(contents: ProposalContents): ProposalComputation {
  const cosmology = cosmologyOf(contents.cosmology.parameters)
  const comparison = comparisonOf(contents.cosmology)
  const season = darkHours(contents)
  const dates = season.nights.map(({ date }) => date)

  const targets = contents.targets.map((target) =>
    computeTarget({
      target,
      cosmology,
      comparison,
      visible: season.byTarget.get(String(target.id)) ?? null,
      dates,
    }),
  )
  const observations: ObservationComputation[] = []
  const checks = observations.flatMap((observation) => observation.checks)
  const askedSeconds = contents.observations.reduce((sum, { askedSeconds: asked }) => sum + asked, 0)
  const darkSeconds = season.nights.reduce((sum, night) => sum + night.darkHours * 3600, 0)
  return {
    engineVersion,
    cosmologyName: contents.cosmology.parameters.name,
    recordVersions: recordVersions(contents),
    targets,
    observations,
    askedSeconds,
    neededSeconds: observations.reduce((sum, { neededSeconds }) => sum + (neededSeconds ?? 0), 0),
    askedNights: darkSeconds > 0 ? (askedSeconds * season.nights.length) / darkSeconds : 0,
    checksClear: checks.filter(({ verdict }) => verdict === 'feasible').length,
    checksTotal: checks.length,
    verdict: proposalVerdict(contents.targets, contents.observations, observations),
  }
}
