import type { TargetComputation } from '../observations/types'
import type { Target } from '../proposals/types'
import { exportColumns } from './exportColumns'
import { targetRow } from './targetRow'

/** What a file of targets is made from. */
export interface Exported {
  reference: string
  targets: readonly Target[]
  computed: readonly TargetComputation[]
  cosmologyName: string
  engineVersion: string
}

/** The cells of a file of targets, a row a target, in the order of the columns; empty where there is nothing. */
export function exportTable({ targets, computed, cosmologyName }: Exported): string[][] {
  const byId = new Map(computed.map((one) => [one.targetId, one]))
  return targets.map((target) => {
    const one = { target, row: targetRow(target), numbers: byId.get(target.id), cosmologyName }
    return exportColumns.map(({ value }) => String(value(one) ?? ''))
  })
}
