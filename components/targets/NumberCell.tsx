'use client'

import { ComputedNumber, type ComputedRow } from '@/components/ui/ComputedNumber'
import { ABSENT, formatNumber, formatSigned, NO_BREAK_SPACE } from '@/lib/format'
import type { TargetComputation } from '@/lib/domain/observations/types'
import type { Target } from '@/lib/domain/proposals/types'
import { columnHead, formulas } from './formulas'
import { withUnit, type NumberColumn } from './numberColumns'

export interface NumberCellProps {
  column: NumberColumn
  target: Target
  computed: TargetComputation
  cosmologyName: string
  comparisonName: string | null
  engineVersion: string
}

/** What goes into the formula besides the redshift. */
function inputs({ column, target, computed, cosmologyName }: NumberCellProps): ComputedRow[] {
  const rows: ComputedRow[] = [{ term: 'z', value: `${target.redshiftTyped}, typed` }]
  if (column.id === 'scale' && computed.angularDiameterMpc !== null)
    rows.push({
      term: columnHead('angular', ''),
      value: `${formatNumber(computed.angularDiameterMpc, 3)}${NO_BREAK_SPACE}Mpc`,
    })
  if (column.id === 'modulus' && computed.luminosityMpc !== null)
    rows.push({
      term: columnHead('luminosity', ''),
      value: `${formatNumber(computed.luminosityMpc, 1)}${NO_BREAK_SPACE}Mpc`,
    })
  if (target.redshiftError !== null)
    rows.push({ term: 'error of z', value: `± ${formatNumber(target.redshiftError, 4)}` })
  return [...rows, { term: 'Cosmology', value: cosmologyName }]
}

/** The same number under the other cosmology, and how far it is off. */
function secondOpinion(props: NumberCellProps, value: number): ComputedRow | undefined {
  const { column, computed, comparisonName } = props
  if (!computed.comparison || !column.other || !comparisonName) return undefined
  const other = column.other(computed.comparison)
  const difference =
    column.id === 'modulus'
      ? `${formatSigned(other - value, 2)}${NO_BREAK_SPACE}mag`
      : `${formatSigned((other / value - 1) * 100, 1)}${NO_BREAK_SPACE}%`
  return { term: `Under ${comparisonName}`, value: withUnit(column, other), difference }
}

/** A computed number of a target, which opens to formula, inputs, second opinion and source. */
export function NumberCell(props: NumberCellProps) {
  const { column, target, computed, engineVersion } = props
  const value = column.value(computed)
  if (value === null) return <span className="text-muted">{ABSENT}</span>
  return (
    <ComputedNumber
      shown={formatNumber(value, column.decimals)}
      value={withUnit(column, value)}
      what={`${column.what}, ${target.name}`}
      formula={formulas[column.id]}
      inputs={inputs(props)}
      second={value > 0 ? secondOpinion(props, value) : undefined}
      source={
        <>
          {column.source}. Engine {engineVersion}, relative error below 10<sup>−8</sup>.
        </>
      }
    />
  )
}
