'use client'

import { useMemo } from 'react'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { formatNumber } from '@/lib/format'

export interface YardstickRow {
  z: number
  /** One for each cosmology; null where the redshift does not exist in it. */
  under: ({ luminosityMpc: number; kpcPerArcsec: number; lookbackGyr: number } | null)[]
}

const quantities = [
  ['luminosityMpc', 'D_L', 'Mpc', 1],
  ['kpcPerArcsec', 'scale', 'kpc/″', 3],
  ['lookbackGyr', 'light left', 'Gyr ago', 2],
] as const

/** The numbers: a column group for each cosmology. */
export function YardstickTable({ names, rows }: { names: string[]; rows: YardstickRow[] }) {
  const columns = useMemo<TableColumn<YardstickRow>[]>(
    () => [
      { id: 'z', head: 'z', align: 'right', value: (row) => row.z, cell: (row) => String(row.z) },
      ...names.flatMap((name, index) =>
        quantities.map(([key, head, unit, decimals]): TableColumn<YardstickRow> => ({
          id: `${key}-${index}`,
          head: names.length > 1 ? `${head}, ${name}` : head,
          unit,
          align: 'right',
          computed: index % 2 === 1,
          value: (row) => row.under[index]?.[key] ?? null,
          cell: (row) => {
            const value = row.under[index]?.[key]
            return value === undefined ? 'does not exist' : formatNumber(value, decimals)
          },
        })),
      ),
    ],
    [names],
  )
  return (
    <DataTable
      caption="Distances, scales and times"
      columns={columns}
      rows={rows}
      rowId={(row) => String(row.z)}
      csv="yardstick"
      phone="scroll"
    />
  )
}
