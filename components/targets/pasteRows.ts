import { browserCopy } from '@/components/forms/browserCopy'
import { showToast } from '@/components/ui/showToast'
import { emptyTargetRow, targetRow } from '@/lib/domain/targets/rules'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import { countInWords, formatList } from '@/lib/format'
import type { RowPlace } from './rowViews'
import { spreadCells, type PastedCell } from './spreadCells'
import type { TargetActions } from './targetActions'
import type { UndoStep } from './undoSteps'

/** What the table may do to a row from outside. */
export interface RowHandle {
  /** Types a whole row, which then saves itself or says what is wrong. */
  fill: (row: TargetRow) => void
  /** Takes over what was saved for it with others. */
  adopt: (kept: { row: TargetRow; version: number }) => void
}

interface Latest {
  places: readonly RowPlace[]
  typed: Readonly<Record<string, TargetRow>>
  actions: Pick<TargetActions, 'change'>
  remember: (step: UndoStep) => unknown
}

export interface PasteInto extends Latest {
  reference: string
  handles: ReadonlyMap<string, RowHandle>
  /** Begins so many rows at the end; gives their keys. */
  begin: (count: number) => string[]
}

interface Line {
  /** Null beyond the last row. */
  place: RowPlace | null
  row: TargetRow
}

function linesOf({ places, typed }: Latest, key: string, cells: readonly Partial<TargetRow>[]): Line[] {
  const first = places.findIndex((place) => place.key === key)
  return cells.map((line, index) => {
    const place = places[first + index] ?? null
    const before = place
      ? (typed[place.key] ?? (place.kept ? targetRow(place.kept) : emptyTargetRow))
      : emptyTargetRow
    return { place, row: { ...before, ...line } }
  })
}

const isSound = ({ row }: Line) => targetRowSchema.safeParse(row).success

/**
 * Takes a block of cells from a spreadsheet: rows that can be read are saved together, all or none; the others are
 * typed into the table, where each says what it wants. Rows beyond the last one are begun.
 */
export async function pasteRows(
  into: PasteInto,
  { key, cell, text }: { key: string; cell: PastedCell; text: string },
): Promise<void> {
  const { reference, handles, begin } = into
  const spread = spreadCells(text, cell)
  if (!spread.ok) return showToast(spread.message)
  const lines = linesOf(into, key, spread.lines)
  // A row begun and not saved has a form of its own, which saves it.
  const together = lines.filter((line) => isSound(line) && (line.place === null || line.place.kept !== null))
  const kept = together.flatMap(({ place, row }) =>
    place?.kept ? [{ own: place.kept, row, key: place.key }] : [],
  )
  const fresh = together.filter(({ place }) => place === null).map(({ row }) => row)
  const type = (some: readonly Line[]) => {
    for (const { place, row } of some) if (place) handles.get(place.key)?.fill(row)
    const rows = some.filter(({ place }) => place === null).map(({ row }) => row)
    // A row that is begun brings back what this browser keeps for it.
    for (const [index, begun] of (rows.length > 0 ? begin(rows.length) : []).entries())
      browserCopy.keep(`target-${reference}-${begun}`, { row: rows[index], version: null })
  }
  if (together.length === 0) return type(lines)
  const changed = kept.map(({ own, row }) => ({ id: own.id, version: own.version, row }))
  const result = await into.actions
    .change({ reference, changed, added: fresh, removed: [] })
    .catch(() => null)
  if (!result?.ok) {
    type(lines)
    return showToast(
      result ? `The block was not saved in one piece. ${result.message}` : 'The observatory did not answer.',
    )
  }
  type(lines.filter((line) => !together.includes(line)))
  const { data } = result
  for (const [index, target] of data.changed.entries())
    handles.get(kept[index]?.key ?? '')?.adopt({ row: targetRow(target), version: target.version })
  const said = [
    data.changed.length > 0 ? `${countInWords(data.changed.length, 'row')} changed` : '',
    data.added.length > 0 ? `${countInWords(data.added.length, 'row')} added` : '',
  ].filter(Boolean)
  into.remember({
    kind: 'rows',
    words: formatList(said),
    rows: data.changed.map((target, index) => ({
      id: target.id,
      before: targetRow(kept[index]?.own ?? target),
      version: target.version,
    })),
    added: data.added.map(({ id, version }) => ({ id, version })),
  })
  showToast(`Pasted: ${formatList(said)}`)
}
