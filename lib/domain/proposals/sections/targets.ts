import { countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalComputation } from '../../observations/types'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

function redshifts(values: number[]): string {
  const [low, high] = [Math.min(...values), Math.max(...values)]
  const shown = (z: number) => formatNumber(z, 3)
  return low === high ? `, z ${shown(low)}` : `, z ${shown(low)} to ${shown(high)}`
}

/** At least one target, each with a position, and none the chosen universe does not have. */
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
    if (target.raDeg === null || target.decDeg === null)
      return [at(target.id, `Give the position of ${target.name}.`)]
    const refusal = computation.targets.find(({ targetId }) => targetId === target.id)?.refusal
    return refusal ? [at(target.id, `${target.name}: ${refusal}`)] : []
  })
  const required = targets.filter(({ need }) => need === 'required').length
  const z = targets.flatMap(({ redshift }) => (redshift === null ? [] : [redshift]))
  const needs = targets.length === required ? '' : `, ${required} required`
  return {
    begun: true,
    detail: `${countInWords(targets.length, 'target', 'targets', true)}${needs}${z.length > 0 ? redshifts(z) : ''}`,
    missing,
    wrong: missing.length > 0,
  }
}
