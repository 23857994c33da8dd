'use client'

import { memo, useCallback, useMemo, useRef } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { groupsOf } from '@/lib/domain/tools/yardstick/sheets/groupsOf'
import type { Sheet, SheetRow } from '@/lib/domain/tools/yardstick/sheets/sheet'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import type { CosmologyQuantity } from '@/lib/science/cosmology'
import { ColumnChoice } from './ColumnChoice'
import { ExportBar } from './ExportBar'
import { sheetColumns } from './sheetColumns'
import { toneOf } from './toneOf'

export interface NumbersProps {
  sheet: Sheet
  universes: readonly ReadyUniverse[]
  /** The redshift pointed at in a plot: its row lights. */
  pointed: number | null
  linkable: boolean
  /** The quantities chosen, where a mode lets one choose. */
  columns: readonly CosmologyQuantity[] | null
  onChange: (next: { columns: CosmologyQuantity[] }) => void
}

const ROW_PX = 36

/** The table of every mode, in column groups a cosmology, with its files. Memoised: typing must not wait for it. */
export const Numbers = memo(function Numbers(props: NumbersProps) {
  const { sheet, universes, pointed, linkable, columns: chosen, onChange } = props
  const columns = useMemo(() => sheetColumns(sheet, universes), [sheet, universes])
  const groups = useMemo(
    () =>
      groupsOf(sheet.columns, universes).map(({ place, name, span }) =>
        place === null ? { name: '', span } : { name, span, tone: toneOf(place) },
      ),
    [sheet, universes],
  )
  const shown = useRef<readonly SheetRow[]>(sheet.rows)
  const onShown = useCallback((rows: readonly SheetRow[]) => {
    shown.current = rows
  }, [])
  return (
    <section className="mt-12">
      <SectionHeading
        title={sheet.title === 'Distances, times and sizes' ? 'The numbers' : sheet.title}
        aside={
          <span className="flex flex-wrap items-baseline gap-x-6 gap-y-1" data-no-print>
            {chosen ? (
              <ColumnChoice columns={chosen} onChange={(next) => onChange({ columns: next })} />
            ) : null}
            <ExportBar
              sheet={() => ({ ...sheet, rows: [...shown.current] })}
              universes={universes}
              linkable={linkable}
            />
          </span>
        }
      />
      <div className="table-figures mt-3">
        <DataTable
          caption={sheet.title}
          columns={columns}
          rows={sheet.rows}
          rowId={(row) => String(row.id)}
          tone={({ cells }) =>
            (pointed !== null && cells[0]?.value === pointed) || cells.some(({ caution }) => caution)
              ? 'attention'
              : null
          }
          groups={groups.some((group) => 'tone' in group) ? groups : undefined}
          rowHeight={ROW_PX}
          onShown={onShown}
          phone="scroll"
        />
      </div>
    </section>
  )
})
