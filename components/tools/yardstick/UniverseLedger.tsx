import { SeriesSwatch } from '@/components/charts/SeriesSwatch'
import { missingSentence } from '@/lib/domain/tools/yardstick/missingSentence'
import type { MeasuredUniverse } from '@/lib/domain/tools/yardstick/universes'
import { toneOf } from './toneOf'

export interface UniverseLedgerProps {
  universes: readonly MeasuredUniverse[]
  redshifts: readonly number[]
}

/** What kind of universe each cosmology is, in a sentence, and which of the redshifts it does not have. */
export function UniverseLedger({ universes, redshifts }: UniverseLedgerProps) {
  return (
    <ul className="plain-list rule-open" aria-label="What kind of universe each cosmology is">
      {universes.map((universe) => {
        const { place, name, cosmology, sentence } = universe
        const missing = cosmology ? missingSentence(redshifts, { ...universe, cosmology }) : null
        return (
          <li
            key={place}
            className="grid gap-x-8 gap-y-1 border-b border-rule py-3 md:grid-cols-[15.5rem_minmax(0,1fr)]"
          >
            <span className="flex items-baseline gap-3">
              <SeriesSwatch tone={toneOf(place)} />
              <strong
                className="font-semibold [overflow-wrap:anywhere]"
                style={{ color: `var(--${toneOf(place)})` }}
              >
                {name}
              </strong>
            </span>
            <span>
              {cosmology ? sentence : <span className="text-not-feasible">{sentence}</span>}
              {missing ? <span className="block text-table text-not-feasible">{missing}</span> : null}
            </span>
          </li>
        )
      })}
    </ul>
  )
}
