import type { ConstraintSet, Observation, ProposalContents, Target } from '../proposals/types'
import { defaultConstraints } from './defaultConstraints'
import type { ReportContents } from './reportContents'
import { seasonVisibility, type SeasonVisibility } from './seasonVisibility'
import { skyTargetOf } from './skyTargetOf'

export type Conditions = Omit<ConstraintSet, 'id' | 'version'>

/** The conditions an observation asks for. */
export function conditionsOf(
  contents: Pick<ProposalContents, 'constraintSets'>,
  observation: Pick<Observation, 'constraintSetId'> | undefined,
): Conditions {
  const named = contents.constraintSets.find(({ id }) => id === observation?.constraintSetId)
  return named ?? contents.constraintSets[0] ?? defaultConstraints
}

/**
 * Hours of each target through the whole season of the call, dark and above the airmass its first observation
 * asks for, whatever the Moon does. Targets that share an airmass are computed together.
 */
export function darkHours(contents: ReportContents): SeasonVisibility {
  const byAirmass = new Map<number, Target[]>()
  for (const target of contents.targets) {
    const first = contents.observations.find(({ targetId }) => targetId === target.id)
    const { maxAirmass } = conditionsOf(contents, first)
    byAirmass.set(maxAirmass, [...(byAirmass.get(maxAirmass) ?? []), target])
  }
  const season = { from: contents.call.seasonFrom, to: contents.call.seasonTo }
  const whole = seasonVisibility(contents.site, { ...season, maxAirmass: defaultConstraints.maxAirmass }, [])
  const byTarget: SeasonVisibility['byTarget'] = new Map()
  for (const [maxAirmass, targets] of byAirmass) {
    const sky = targets.flatMap((target) => skyTargetOf(target) ?? [])
    for (const [id, one] of seasonVisibility(contents.site, { ...season, maxAirmass }, sky).byTarget)
      byTarget.set(id, one)
  }
  return { nights: whole.nights, byTarget }
}
