'use client'

import { useMemo } from 'react'
import { UnderlineChoice } from '@/components/ui/UnderlineChoice'
import { plotQuantity, plotRatio } from '@/lib/domain/tools/yardstick/curves'
import { plotExposure } from '@/lib/domain/tools/yardstick/plotExposure'
import { readValues } from '@/lib/domain/tools/yardstick/inverseFields'
import { quantityOf } from '@/lib/domain/tools/yardstick/quantities'
import type { YardstickState } from '@/lib/domain/tools/yardstick/state'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import type { YardstickView } from '@/lib/domain/tools/yardstick/viewOf'
import { drawChoices } from './drawChoices'
import { HistoryPlot } from './HistoryPlot'
import { QuantityPlot } from './QuantityPlot'

export interface ModePlotsProps {
  view: YardstickView
  reference: ReadyUniverse
  onChange: (next: Partial<YardstickState>) => void
  onPoint: (z: number | null) => void
}

const HEIGHT = 372
const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1)

/** The quantity chosen against redshift, beside the history of each universe or the exposure it asks for. */
export function ModePlots({ view, reference, onChange, onPoint }: ModePlotsProps) {
  const { state, ready: universes, redshifts } = view
  const { mode } = state
  // The way back draws what is known, with the values given; a survey the volume its shells are made of.
  const draw = mode === 'inverse' ? state.from : mode === 'survey' ? 'differentialVolumeMpc3Sr' : state.draw
  const compare = mode === 'compare'
  const quantity = quantityOf(draw)
  const plot = useMemo(
    () =>
      compare ? plotRatio(universes, reference, draw, redshifts) : plotQuantity(universes, draw, redshifts),
    [compare, universes, reference, draw, redshifts],
  )
  const exposure = useMemo(
    () => (compare ? plotExposure(universes, reference, redshifts) : null),
    [compare, universes, reference, redshifts],
  )
  const name = capital(quantity?.name ?? draw)
  const against =
    draw === 'distanceModulusMag' ? `minus that of ${reference.name}, mag` : `over that of ${reference.name}`
  return (
    <>
      {mode === 'inverse' || mode === 'survey' ? null : (
        <div className="mt-7">
          <UnderlineChoice
            label="Draw"
            shown
            options={drawChoices(draw)}
            value={draw}
            onChange={(value) => onChange({ draw: value })}
          />
        </div>
      )}
      <div className="mt-6 grid gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1.9fr)_minmax(0,1fr)]">
        <QuantityPlot
          title={compare ? `${name} ${against}` : quantity?.unit ? `${name}, ${quantity.unit}` : name}
          name={compare ? `${name} ${against}` : name}
          plot={plot}
          redshifts={redshifts}
          decimals={compare ? 4 : (quantity?.decimals ?? 1)}
          yDomain={
            compare ? around(plot.curves.flatMap(({ points }) => points.map(([, y]) => y))) : undefined
          }
          guides={mode === 'inverse' ? guidesOf(view) : undefined}
          fileName={compare ? 'yardstick-ratio' : 'yardstick-curve'}
          height={HEIGHT}
          onPoint={onPoint}
        />
        {exposure ? (
          <QuantityPlot
            title="Exposure, sky-limited, ratio"
            name={`Exposure time of a source of given luminosity where the sky limits, ${reference.name} = 1,`}
            plot={exposure}
            redshifts={redshifts}
            decimals={3}
            yDomain={around(exposure.curves.flatMap(({ points }) => points.map(([, y]) => y)))}
            fileName="yardstick-exposure"
            height={HEIGHT}
          />
        ) : (
          <HistoryPlot universes={universes} height={HEIGHT} />
        )}
      </div>
    </>
  )
}

const MOST_GUIDES = 4

/** The values looked for, as levels of the plot. */
function guidesOf({ state, sheet }: YardstickView) {
  const { values } = readValues(state.values, state.from)
  const found = values.filter((_, row) =>
    sheet?.rows[row]?.cells.slice(1).some(({ value }) => value !== null),
  )
  const words = new Map(found.map(({ text, value }) => [text, value]))
  return words.size > MOST_GUIDES ? [] : [...words].map(([text, y]) => ({ y, words: text }))
}

/** A little more than the values span, so that a line along an edge is seen. */
function around(values: readonly number[]): readonly [number, number] | undefined {
  if (values.length === 0) return undefined
  const low = values.reduce((a, b) => Math.min(a, b), Infinity)
  const high = values.reduce((a, b) => Math.max(a, b), -Infinity)
  const room = (high - low || 0.1) * 0.12
  return [low - room, high + room]
}
