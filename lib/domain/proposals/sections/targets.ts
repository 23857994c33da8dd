import { countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalComputation } from '../../observations/types'
import { needOf } from '../../observations/needOf'
import type { ProposalContents } from '../types'
import { groupsLacking } from './groups'
import type { Finding, Missing } from './finding'

function redshifts(values: number[]): string {
  const [low, high] = [Math.min(...values), Math.max(...values)]
  const shown = (z: number) => formatNumber(z, 3)
  return low === high ? `, z ${shown(low)}` : `, z ${shown(low)} to ${shown(high)}`
}

/** What is awaited has no position yet, where the kind of proposal takes such targets. */
const positionWanted = ({ kind }: ProposalContents, name: string) =>
  kind.takesAwaited
    ? `Give the position of ${name}, or say what triggers it.`
    : `Give the position of ${name}.`

/** At least one target that is no backup, each with a position or a trigger, groups whose rules can hold, and none the chosen universe does not have. */
export function targetsFinding(contents: ProposalContents, computation: ProposalComputation): Finding {
  const { targets, reference } = contents
  const href = paths.proposalSection(reference, 'targets')
  const at = (id: number, sentence: string): Missing => ({
    section: 'targets',
    field: `target-${id}`,
    sentence,
    href: `${href}#target-${id}`,
  })
  if (targets.length === 0)
    return {
      begun: false,
      detail: 'Positions, redshifts and magnitudes',
      missing: [{ section: 'targets', field: null, sentence: 'Add a target.', href }],
    }
  const missing = targets.flatMap((target) => {
    if ((target.raDeg === null || target.decDeg === null) && !target.opportunity)
      return [at(target.id, positionWanted(contents, target.name))]
    const refusal = computation.targets.find(({ targetId }) => targetId === target.id)?.refusal
    return refusal ? [at(target.id, `${target.name}: ${refusal}`)] : []
  })
  const most = contents.kind.targetLimit
  if (most !== null && targets.length > most) {
    const sentence = `${countInWords(targets.length, 'target', 'targets', true)} are named; this kind of proposal may name ${countInWords(most, '', '').trim()}.`
    missing.push({ section: 'targets', field: null, sentence, href })
  }
  missing.push(...groupsLacking(contents, href))
  const required = targets.filter((target) => needOf(target, contents.groups) === 'required').length
  const z = targets.flatMap(({ redshift }) => (redshift === null ? [] : [redshift]))
  const needs = targets.length === required || required === 0 ? '' : `, ${required} required`
  const inGroups = contents.groups.length > 0 ? `, ${countInWords(contents.groups.length, 'group')}` : ''
  return {
    begun: true,
    detail: `${countInWords(targets.length, 'target', 'targets', true)}${needs}${inGroups}${z.length > 0 ? redshifts(z) : ''}`,
    missing,
    wrong: missing.length > 0,
  }
}
