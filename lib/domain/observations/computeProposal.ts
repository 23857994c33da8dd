import type { Cosmology } from '@/lib/science/cosmology'
import { computeTarget } from './computeTarget'
import { comparisonOf, cosmologyOf } from './cosmologyOf'
import { engineVersion } from './engineVersion'
import { groupsVerdict } from './groupsVerdict'
import { recordVersions } from './recordVersions'
import { rememberedObservation } from './rememberedObservation'
import type { ReportContents } from './reportContents'
import { notAskedTwice } from './requestChecks'
import { darkHours } from './seasonOf'
import { timesAsked } from './timesAsked'
import type { ObservationComputation, ProposalComputation } from './types'
import { worstVerdict } from './worstVerdict'

function computeObservations(contents: ReportContents, cosmology: Cosmology): ObservationComputation[] {
  const targets = new Map(contents.targets.map((target) => [target.id, target]))
  const times = timesAsked(contents)
  return contents.observations.flatMap((observation): ObservationComputation[] => {
    const target = targets.get(observation.targetId)
    if (!target) return []
    const mode = contents.modes.find(({ modeId }) => modeId === observation.modeId)
    const one = {
      ...rememberedObservation({ contents, target, observation, mode, cosmology }),
      times: times.get(target.id) ?? 1,
    }
    const twice = notAskedTwice(observation, mode, contents.observations, targets)
    if (!twice) return [one]
    const verdict = worstVerdict([one.verdict, twice.verdict]) ?? one.verdict
    return [{ ...one, checks: [...one.checks, twice], verdict }]
  })
}

/**
 * Everything computed for a proposal: distances and hours of each target, exposure and checks of each observation,
 * and what the request comes to. Pure and the same on server and in the browser: same contents, same bytes.
 */
export function computeProposal(contents: ReportContents): ProposalComputation {
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
  const observations = computeObservations(contents, cosmology)
  const checks = observations.flatMap((observation) => observation.checks)
  const asked = new Map(contents.observations.map(({ id, askedSeconds: own }) => [id, own]))
  const summed = (of: (one: ObservationComputation) => number | null | undefined) =>
    observations.reduce((sum, one) => sum + one.times * (of(one) ?? 0), 0)
  const askedSeconds = summed(({ observationId }) => asked.get(observationId))
  const { verdict, groups } = groupsVerdict(contents, observations)
  const darkSeconds = season.nights.reduce((sum, night) => sum + night.darkHours * 3600, 0)
  return {
    engineVersion,
    cosmologyName: contents.cosmology.parameters.name,
    recordVersions: recordVersions(contents),
    targets,
    observations,
    groups,
    askedSeconds,
    neededSeconds: summed(({ neededSeconds }) => neededSeconds),
    askedNights: darkSeconds > 0 ? (askedSeconds * season.nights.length) / darkSeconds : 0,
    checksClear: checks.filter(({ verdict }) => verdict === 'feasible').length,
    checksTotal: checks.length,
    verdict,
  }
}
