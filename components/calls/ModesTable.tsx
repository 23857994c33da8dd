'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import type { ModeRecord } from '@/lib/domain/facility/types'
import { formatNumber } from '@/lib/format'

const columns: TableColumn<ModeRecord>[] = [
  { id: 'mode', head: 'Mode', value: (row) => row.name },
  { id: 'telescope', head: 'Telescope', value: (row) => row.telescope.name },
  {
    id: 'range',
    head: 'Range',
    unit: 'Å',
    align: 'right',
    value: (row) => row.wavelengthMinA,
    cell: (row) => `${formatNumber(row.wavelengthMinA, 0)} to ${formatNumber(row.wavelengthMaxA, 0)}`,
  },
  { id: 'medium', head: 'In', value: (row) => row.medium },
  {
    id: 'resolving',
    head: 'Resolving power',
    align: 'right',
    value: (row) => row.resolvingPower,
    cell: (row) => (row.resolvingPower ? formatNumber(row.resolvingPower, 0) : '–'),
  },
  {
    id: 'pixel',
    head: 'Pixel',
    unit: 'arcsec',
    align: 'right',
    value: (row) => row.pixelScaleArcsec,
    cell: (row) => formatNumber(row.pixelScaleArcsec, 2),
  },
  {
    id: 'noise',
    head: 'Read noise',
    unit: 'e⁻',
    align: 'right',
    value: (row) => row.readNoiseE,
    cell: (row) => formatNumber(row.readNoiseE, 1),
  },
]

/** Modes on offer with the facts one chooses by. */
export function ModesTable({ modes }: { modes: ModeRecord[] }) {
  return (
    <DataTable
      caption="Instrument modes on offer"
      columns={columns}
      rows={modes}
      rowId={(row) => row.slug}
      find="Mode or telescope"
      csv="instrument-modes"
      phone="scroll"
    />
  )
}
