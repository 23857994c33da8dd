import type { ModeRecord } from '../facility/types'
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

interface Limits {
  maxAirmass: number
  telescope: ModeRecord['telescope'] | undefined
}

/**
 * Hours of each target through the whole season of the call, dark, above the airmass its first observation asks for
 * and where that one's telescope can point, whatever the Moon does. Targets that share them are computed together.
 */
export function darkHours(contents: ReportContents): SeasonVisibility {
  const groups = new Map<string, { limits: Limits; targets: Target[] }>()
  for (const target of contents.targets) {
    const first = contents.observations.find(({ targetId }) => targetId === target.id)
    const { maxAirmass } = conditionsOf(contents, first)
    const telescope = contents.modes.find(({ modeId }) => modeId === first?.modeId)?.telescope
    const key = `${maxAirmass} ${telescope?.id ?? ''}`
    const group = groups.get(key) ?? { limits: { maxAirmass, telescope }, targets: [] }
    group.targets.push(target)
    groups.set(key, group)
  }
  const season = { from: contents.call.seasonFrom, to: contents.call.seasonTo }
  const whole = seasonVisibility(contents.site, { ...season, maxAirmass: defaultConstraints.maxAirmass }, [])
  const byTarget: SeasonVisibility['byTarget'] = new Map()
  for (const { limits, targets } of groups.values()) {
    const sky = targets.flatMap((target) => skyTargetOf(target) ?? [])
    for (const [id, one] of seasonVisibility(contents.site, { ...season, ...limits }, sky).byTarget)
      byTarget.set(id, one)
  }
  return { nights: whole.nights, byTarget }
}
