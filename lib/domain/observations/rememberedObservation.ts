import { boundedMap } from './boundedMap'
import { computeObservation, type ObservationInput } from './computeObservation'
import type { ReportContents } from './reportContents'
import { conditionsOf } from './seasonOf'
import type { ObservationComputation, ProposalComputation } from './types'

const kept = boundedMap<ObservationComputation>(2000)

/** Everything an observation's numbers follow from, and nothing else. */
function keyOf({ contents, target, observation, mode, cosmology }: ObservationInput): string {
  return JSON.stringify([
    contents.site,
    contents.call.seasonFrom,
    contents.call.seasonTo,
    cosmology.parameters,
    conditionsOf(contents, observation),
    {
      ...target,
      version: 0,
      position: 0,
      name: '',
      group: null,
      need: null,
      raTyped: '',
      decTyped: '',
      redshiftTyped: '',
    },
    mode ?? null,
    { ...observation, id: 0, version: 0, position: 0 },
  ])
}

/** The computation of an observation, kept: a change to one row computes that row alone. */
export function rememberedObservation(input: ObservationInput): ObservationComputation {
  const one = kept.getOr(keyOf(input), () => computeObservation(input))
  return { ...one, observationId: input.observation.id, targetId: input.target.id }
}

/** Takes over what the server computed, so that the browser need not do it again. */
export function takeOver(
  contents: ReportContents,
  computation: ProposalComputation,
  cosmology: ObservationInput['cosmology'],
): void {
  for (const one of computation.observations) {
    const observation = contents.observations.find(({ id }) => id === one.observationId)
    const target = contents.targets.find(({ id }) => id === one.targetId)
    if (!observation || !target) continue
    const mode = contents.modes.find(({ modeId }) => modeId === observation.modeId)
    const checks = one.checks.filter(({ id }) => id !== 'not-asked-twice')
    kept.set(keyOf({ contents, target, observation, mode, cosmology }), { ...one, checks })
  }
}
