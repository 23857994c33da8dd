import type { ActionResult } from '@/lib/actions/result'
import type { ObservationComputation, TargetComputation, Verdict } from '@/lib/domain/observations/types'
import type { Observation, Target } from '@/lib/domain/proposals/types'
import type { TargetRow } from '@/lib/domain/targets/schema'
import type { NumberColumn } from './numberColumns'
import type { PastedCell } from './spreadCells'
import type { TargetActions } from './targetActions'
import type { RowHandle } from './pasteRows'

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
  /** What else keeps the telescope off it, as `, clear of the horizon`; empty for nothing. */
  limits: string
  /** How often its hours count in those asked; null while nothing observes it. */
  times: number | null
}

/** What a row may do; the same functions as long as the page stands. */
export interface RowDeeds {
  ask: TargetActions['ask']
  onTyped: (key: string, row: TargetRow) => void
  onSave: (key: string, row: TargetRow, version: number | null) => Promise<ActionResult<Target>>
  onMove: (key: string, by: -1 | 1) => Promise<void>
  onRemove: (key: string) => Promise<void>
  onPaste: (key: string, cell: PastedCell, text: string) => Promise<void>
  /** Gives the table a handle on the row; null when the row goes. */
  onReady: (key: string, handle: RowHandle | null) => void
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
  deeds: RowDeeds
}
