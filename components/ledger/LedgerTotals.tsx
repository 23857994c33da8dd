'use client'

import { parseAsStringLiteral, useQueryState } from 'nuqs'
import { DataTable } from '@/components/tables/DataTable'
import { UnderlineChoice } from '@/components/ui/UnderlineChoice'
import type { FeeBook } from '@/lib/domain/fees/types'
import { ledgerTotals } from './ledgerSums'
import { totalColumns } from './ledgerColumns'

const groupings = ['call', 'state', 'class'] as const

const options = [
  { value: 'call', label: 'by call' },
  { value: 'state', label: 'by what became of them' },
  { value: 'class', label: 'by where they are led from' },
] as const

/** Fees summed one of three ways; the way stands in the address. */
export function LedgerTotals({ fees, currency }: { fees: readonly FeeBook[]; currency: string }) {
  const [by, setBy] = useQueryState('by', parseAsStringLiteral(groupings).withDefault('call'))
  return (
    <>
      <UnderlineChoice
        label="Totals"
        shown
        options={options}
        value={by}
        onChange={(next) => void setBy(next)}
      />
      <div className="mt-4">
        <DataTable
          key={by}
          caption="Totals"
          columns={totalColumns(by, currency)}
          rows={ledgerTotals(
            fees.filter((fee) => fee.currency === currency),
            by,
          )}
          rowId={(row) => row.key}
          csv={`fees-by-${by}`}
          urlPrefix="t-"
        />
      </div>
    </>
  )
}
