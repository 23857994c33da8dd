import type { ActionResult } from '@/lib/actions/result'
import type { ObservationComputation, TargetComputation, Verdict } from '@/lib/domain/observations/types'
import type { Observation, Target } from '@/lib/domain/proposals/types'
import type { TargetRow } from '@/lib/domain/targets/schema'
import type { NumberColumn } from './numberColumns'
import type { TargetActions } from './targetActions'

/** One row as it stands on screen. */
export interface RowView {
  key: string
  /** As the server keeps it; null for a row not kept yet. */
  kept: Target | null
  /** As typed. */
  target: Target
  computed: TargetComputation | null
  observations: Observation[]
  observationNumbers: ObservationComputation[]
  neededSeconds: number | null
  verdict: Verdict | null
  maxAirmass: number
  /** How often its hours count in those asked; null while nothing observes it. */
  times: number | null
}

export interface TargetTableProps {
  reference: string
  rows: readonly RowView[]
  columns: readonly NumberColumn[]
  /** Why nothing can be changed; null when it can. */
  readOnly: string | null
  numbers: { cosmologyName: string; comparisonName: string | null; engineVersion: string }
  season: { seasonFrom: string; seasonTo: string; fullBar: number }
  /** Names of the groups of the proposal. */
  groups: readonly string[]
  /** Whether what is awaited may be asked for. */
  takesAwaited: boolean
  actions: TargetActions
  onTyped: (key: string, row: TargetRow) => void
  onSave: (key: string, row: TargetRow, version: number | null) => Promise<ActionResult<Target>>
  onMove: (key: string, by: -1 | 1) => void
  onRemove: (key: string) => void
}
