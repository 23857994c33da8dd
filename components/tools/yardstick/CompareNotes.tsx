'use client'

import { SeriesSwatch } from '@/components/charts/SeriesSwatch'
import { TableFrame } from '@/components/tables/TableFrame'
import { exposureEffects } from '@/lib/domain/tools/yardstick/exposureEffects'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { formatNumber, TRUE_MINUS } from '@/lib/format'
import { toneOf } from './toneOf'

export interface CompareNotesProps {
  universes: readonly ReadyUniverse[]
  reference: ReadyUniverse
  /** The redshift it is said for. */
  z: number
}

/** `0.771 times as long, −22.9 %`. */
function timeWords(ratio: number): string {
  const percent = (ratio - 1) * 100
  const sign = percent < 0 ? TRUE_MINUS : '+'
  return `${formatNumber(ratio, 3)} times as long, ${sign}${formatNumber(Math.abs(percent), 1)}\u00a0%`
}

const heads = [
  ['Under', ''],
  ['Its luminosity is given', 'own light limits the noise'],
  ['Its luminosity is given', 'the sky limits the noise'],
  ['Its magnitude was observed', 'whatever limits the noise'],
]

/** What the choice of cosmology does to an exposure: much, more, or nothing. */
export function CompareNotes({ universes, reference, z }: CompareNotesProps) {
  const effects = exposureEffects(z, universes, reference)
  return (
    <section className="mt-8">
      <h2 className="text-section">What the choice does to an exposure</h2>
      <p className="mt-1 mb-3 max-w-prose text-table text-muted">
        A source at z = {z}, against {reference.name}. The time goes as the luminosity distance squared where
        the source’s own light limits the noise, and to the fourth power where the sky does.
      </p>
      {effects.length === 0 ? (
        <p className="border-y border-rule py-3">
          {universes.length < 2
            ? 'Add a second cosmology to compare.'
            : `${reference.name} gives no distance at z = ${z} to compare with.`}
        </p>
      ) : (
        <TableFrame caption={`Exposure times at z = ${z} against ${reference.name}`} phone="scroll">
          <thead role="rowgroup">
            <tr role="row">
              {heads.map(([head, unit]) => (
                <th key={`${head}${unit}`} role="columnheader" scope="col">
                  {head}
                  <span className="unit">{unit}</span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody role="rowgroup">
            {effects.map(({ place, name, sourceLimited, skyLimited }) => (
              <tr key={place} role="row">
                <th role="rowheader" scope="row">
                  <span className="flex items-center gap-3" style={{ color: `var(--${toneOf(place)})` }}>
                    <SeriesSwatch tone={toneOf(place)} />
                    {name}
                  </span>
                </th>
                <td role="cell">{timeWords(sourceLimited)}</td>
                <td role="cell">{timeWords(skyLimited)}</td>
                <td role="cell">no difference</td>
              </tr>
            ))}
          </tbody>
        </TableFrame>
      )}
    </section>
  )
}
