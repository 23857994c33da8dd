import { countInWords, formatHoursFromSeconds, formatList } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalComputation } from '../../observations/types'
import { groupOf } from '../../observations/groupOf'
import { needOf } from '../../observations/needOf'
import type { ProposalContents, TargetGroup } from '../types'
import { conditionsLacking } from './conditions'
import type { Finding, Missing } from './finding'

function words({ observations, modes }: ProposalContents): string {
  const used = new Set(observations.map(({ modeId }) => modeId))
  const instruments = new Set(
    modes.filter(({ modeId }) => used.has(modeId)).map(({ instrument }) => instrument.name),
  )
  const features = new Set(observations.flatMap(({ feature }) => (feature ? [feature] : [])))
  const of = features.size > 0 ? ` of ${formatList([...features].slice(0, 3))}` : ''
  return `${formatList([...instruments])}, ${countInWords(observations.length, 'observation')}${of}`
}

const shortOf = ({ name, atLeast }: TargetGroup, asked: number) =>
  `${name} wants ${countInWords(atLeast ?? 1, 'target')} observed; ${asked === 0 ? 'none is' : `only ${countInWords(asked, 'is', 'are')}`}.`

/** Every required target is observed, as many of each group as it wants, each observation can be computed, and the whole stays within the kind's time. */
export function observingFinding(contents: ProposalContents, computation: ProposalComputation): Finding {
  const { groups, targets, observations, kind, reference } = contents
  const href = paths.proposalSection(reference, 'observing')
  const lacks = (sentence: string, id?: number): Missing => ({
    section: 'observing',
    field: id === undefined ? null : `observation-${id}`,
    sentence,
    href: id === undefined ? href : `${href}#observation-${id}`,
  })
  if (observations.length === 0)
    return {
      begun: false,
      detail: 'Instrument, depth and hours for each target',
      missing: [lacks('Say what is to be observed.')],
    }
  const nameOf = (targetId: number) => targets.find(({ id }) => id === targetId)?.name ?? 'A target'
  const observed = new Set(observations.map(({ targetId }) => targetId))
  const bare = targets.filter((target) => needOf(target, groups) === 'required' && !observed.has(target.id))
  const absent = [
    ...bare.map(({ name }) => lacks(`${name} is required, but nothing observes it.`)),
    ...groups.flatMap((group) => {
      const asked = targets.filter((one) => groupOf(one, groups) === group && observed.has(one.id)).length
      const isShort = group.rule === 'at-least' && asked < (group.atLeast ?? 1)
      return isShort ? [lacks(shortOf(group, asked))] : []
    }),
  ]
  const missing = [...absent]
  for (const { id, targetId, askedSeconds } of observations) {
    if (askedSeconds <= 0) missing.push(lacks(`Ask for time on ${nameOf(targetId)}.`, id))
    const computed = computation.observations.find(({ observationId }) => observationId === id)
    if (computed?.refusal) missing.push(lacks(`${nameOf(targetId)}: ${computed.refusal}`, id))
  }
  const isOver = kind.maxSeconds !== null && computation.askedSeconds > kind.maxSeconds
  if (isOver)
    missing.push(
      lacks(
        `${formatHoursFromSeconds(computation.askedSeconds)} are asked; this kind of proposal may ask for ${formatHoursFromSeconds(kind.maxSeconds)}.`,
      ),
    )
  absent.push(...conditionsLacking(contents, href))
  missing.push(...conditionsLacking(contents, href))
  return { begun: true, detail: words(contents), missing, wrong: missing.length > absent.length }
}
