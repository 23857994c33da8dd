'use client'

import { useState } from 'react'
import { Popover } from '@/components/ui/Popover'
import { buttonClasses } from '@/components/ui/buttonClasses'
import { emptyOwn, type Chosen } from '@/lib/domain/tools/yardstick/state'
import { cosmologyPresets } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'

export interface AddCosmologyProps {
  chosen: readonly Chosen[]
  onAdd: (one: Chosen) => void
}

const standings = [
  ['current', 'Supported by data'],
  ['limiting', 'Limiting cases'],
] as const

const row =
  'flex min-h-9 w-full items-baseline justify-between gap-4 border-t border-rule py-2 text-left hover:bg-wash max-sm:min-h-11'

/** The published cosmologies not chosen yet, and one's own parameters. */
export function AddCosmology({ chosen, onAdd }: AddCosmologyProps) {
  // A new key closes the panel once something was chosen.
  const [round, setRound] = useState(0)
  const add = (one: Chosen) => {
    setRound(round + 1)
    onAdd(one)
  }
  const left = cosmologyPresets.filter(({ id }) => !chosen.some((one) => one.id === id))
  return (
    <div className="mt-3">
      <Popover
        key={round}
        label="Add a cosmology"
        trigger={
          <button type="button" className={buttonClasses('secondary', 'small', false, false)}>
            Add a cosmology
          </button>
        }
      >
        {standings.map(([standing, title]) => {
          const some = left.filter((preset) => preset.standing === standing)
          return some.length > 0 ? (
            <div key={standing} className="mb-4">
              <p className="mb-1 text-caption font-semibold text-muted">{title}</p>
              {some.map(({ id, parameters }) => (
                <button key={id} type="button" className={row} onClick={() => add({ own: null, id })}>
                  <span className="font-semibold">{parameters.name}</span>
                  <span className="text-caption whitespace-nowrap text-muted">
                    H₀ {formatNumber(parameters.H0, 2)}, Ωm {formatNumber(parameters.Om0, 3)}
                  </span>
                </button>
              ))}
            </div>
          ) : null
        })}
        <button
          type="button"
          className={row}
          onClick={() => add({ own: { ...emptyOwn, Tcmb0: '2.7255', Neff: '3.046' }, id: null })}
        >
          <span className="font-semibold">Own parameters</span>
          <span className="text-caption text-muted">any universe, curved or not</span>
        </button>
      </Popover>
    </div>
  )
}
