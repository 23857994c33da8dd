'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { formatNumber } from '@/lib/format'

export interface CosmologyRow {
  id: string
  name: string
  H0: number
  Om0: number
  ageGyr: number | null
  standing: 'current' | 'limiting'
}

const columns: TableColumn<CosmologyRow>[] = [
  { id: 'name', head: 'Cosmology', value: (row) => row.name },
  {
    id: 'h0',
    head: 'H₀',
    unit: 'km/s/Mpc',
    align: 'right',
    value: (row) => row.H0,
    cell: (row) => formatNumber(row.H0, 2),
  },
  { id: 'om', head: 'Ωₘ', align: 'right', value: (row) => row.Om0, cell: (row) => formatNumber(row.Om0, 4) },
  {
    id: 'age',
    head: 'Age',
    unit: 'Gyr',
    align: 'right',
    computed: true,
    value: (row) => row.ageGyr,
    cell: (row) => formatNumber(row.ageGyr, 2),
  },
  {
    id: 'standing',
    head: 'Standing',
    value: (row) => (row.standing === 'current' ? 'measured' : 'limiting case'),
  },
]

/** A table to try: the cosmologies on offer, with the age that follows from each. */
export function CosmologyTable({ rows }: { rows: readonly CosmologyRow[] }) {
  return (
    <DataTable
      caption="Cosmologies on offer"
      columns={columns}
      rows={rows}
      rowId={(row) => row.id}
      find="Name of a cosmology"
      chips={[{ id: 'measured', label: 'Measured', matches: (row) => row.standing === 'current' }]}
      csv="cosmologies"
    />
  )
}
