'use client'

import { useMemo } from 'react'
import { plotQuantity } from '@/lib/domain/tools/yardstick/curves'
import { MOST_OPEN, plotLeftOpen } from '@/lib/domain/tools/yardstick/plotLeftOpen'
import type { Surroundings } from '@/lib/domain/tools/yardstick/sheets/nearSheet'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { QuantityPlot } from './QuantityPlot'

export interface NearPlotsProps {
  universes: readonly ReadyUniverse[]
  reference: ReadyUniverse
  around: Surroundings
  redshifts: readonly number[]
  onPoint: (z: number | null) => void
}

const HEIGHT = 340
const openDomain = [0, MOST_OPEN] as const
const openGuides = [{ y: 10, words: '10 %' }]

/** How much of a distance stays open near by, beside the distance itself. */
export function NearPlots({ universes, reference, around, redshifts, onPoint }: NearPlotsProps) {
  const leftOpen = useMemo(() => plotLeftOpen(reference, around, redshifts), [reference, around, redshifts])
  const distance = useMemo(() => plotQuantity(universes, 'luminosityMpc', redshifts), [universes, redshifts])
  return (
    <div className="mt-7 grid gap-x-10 gap-y-8 xl:grid-cols-2">
      <QuantityPlot
        title="Left open, % of the distance"
        name="Share of the distance left open, %,"
        plot={leftOpen}
        redshifts={redshifts}
        decimals={1}
        yDomain={openDomain}
        guides={openGuides}
        fileName="yardstick-left-open"
        height={HEIGHT}
        onPoint={onPoint}
      />
      <QuantityPlot
        title="Luminosity distance, Mpc"
        name="Luminosity distance"
        plot={distance}
        redshifts={redshifts}
        decimals={1}
        fileName="yardstick-curve"
        height={HEIGHT}
        onPoint={onPoint}
      />
    </div>
  )
}
