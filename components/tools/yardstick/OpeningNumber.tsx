'use client'

import { useState } from 'react'
import { ComputedNumber } from '@/components/ui/ComputedNumber'
import { formatNumber, formatPercent } from '@/lib/format'
import { FormulaText } from './FormulaText'
import { quantityOf } from '@/lib/domain/tools/yardstick/quantities'
import { readQuantity } from '@/lib/domain/tools/yardstick/reading'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { cosmologyEngineVersion, type CosmologyQuantity } from '@/lib/science/cosmology'

export interface OpeningNumberProps {
  /** As it stands in the cell. */
  shown: string
  value: number
  z: number
  quantity: CosmologyQuantity
  universe: ReadyUniverse
  /** Another cosmology of the page, for a second opinion. */
  other: ReadyUniverse | undefined
}

/**
 * A number of the table that opens to its formula, inputs and source. The panel is made only when it is first asked
 * for: a thousand rows would otherwise carry ten thousand of them.
 */
export function OpeningNumber({ shown, value, z, quantity: id, universe, other }: OpeningNumberProps) {
  const [asked, setAsked] = useState(false)
  const quantity = quantityOf(id)
  if (!asked || !quantity)
    return (
      <button
        type="button"
        aria-haspopup="dialog"
        onClick={() => setAsked(true)}
        className="-mx-1 rounded-cell px-1 decoration-dotted underline-offset-4 hover:underline"
      >
        {shown}
      </button>
    )
  const { H0, Om0, w0, wa } = universe.cosmology.parameters
  const second = other ? readQuantity(other.cosmology, id, z).value : null
  const unit = quantity.fileUnit === '' ? '' : ` ${quantity.unit}`
  return (
    <ComputedNumber
      initiallyOpen
      shown={shown}
      value={`${shown}${unit}`}
      what={`${quantity.name}, z = ${z}`}
      formula={<FormulaText>{quantity.formula}</FormulaText>}
      inputs={[
        { term: 'Cosmology', value: universe.name },
        { term: 'H₀', value: `${formatNumber(H0, 2)} km/s/Mpc` },
        { term: 'Ωm, without neutrinos', value: formatNumber(Om0, 5) },
        { term: 'ΩΛ', value: formatNumber(universe.cosmology.Ode0, 5) },
        ...(w0 === -1 && wa === 0
          ? []
          : [{ term: 'w₀, wₐ', value: `${formatNumber(w0, 3)}, ${formatNumber(wa, 3)}` }]),
      ]}
      second={
        other && second !== null
          ? {
              term: `Under ${other.name}`,
              value: formatNumber(second, shown.split('.')[1]?.length ?? 0),
              difference: value === 0 ? undefined : formatPercent(second / value - 1, 1),
            }
          : undefined
      }
      source={`${quantity.source}. Engine ${cosmologyEngineVersion}.`}
    />
  )
}
