'use client'

import { X } from 'lucide-react'
import { SeriesSwatch } from '@/components/charts/SeriesSwatch'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { MOST_COSMOLOGIES, type Chosen } from '@/lib/domain/tools/yardstick/state'
import type { MeasuredUniverse } from '@/lib/domain/tools/yardstick/universes'
import { AddCosmology } from './AddCosmology'
import { toneOf } from './toneOf'

export interface CosmologyListProps {
  chosen: readonly Chosen[]
  universes: readonly MeasuredUniverse[]
  /** Whose parameters are open beside, by place. */
  editing: number | null
  onAdd: (one: Chosen) => void
  onTakeAway: (place: number) => void
  onEdit: (place: number | null) => void
}

/** The cosmologies side by side, each with its line; own ones open their parameters. */
export function CosmologyList(props: CosmologyListProps) {
  const { chosen, universes, editing, onAdd, onTakeAway, onEdit } = props
  return (
    <section>
      <h2 className="text-body font-semibold">Cosmologies</h2>
      <ul className="plain-list mt-1 border-t border-rule">
        {universes.map(({ place, name, troubles }) => (
          <li key={place} className="flex items-center gap-3 border-b border-rule py-1.5 text-table">
            <SeriesSwatch tone={toneOf(place)} />
            <span className="min-w-0 grow py-1 [overflow-wrap:anywhere]">
              {name}
              {chosen[place]?.own ? (
                <>
                  {' '}
                  <LinkLikeButton
                    aria-expanded={editing === place}
                    aria-label={`Parameters of ${name}`}
                    onClick={() => onEdit(editing === place ? null : place)}
                  >
                    {editing === place ? 'Done' : Object.keys(troubles).length > 0 ? 'Mend' : 'Edit'}
                  </LinkLikeButton>
                </>
              ) : null}
            </span>
            {universes.length > 1 ? (
              <button
                type="button"
                aria-label={`Take away ${name}`}
                onClick={() => onTakeAway(place)}
                className="inline-flex size-8 shrink-0 items-center justify-center rounded text-muted hover:bg-wash hover:text-ink max-sm:size-11"
              >
                <X size={14} aria-hidden="true" />
              </button>
            ) : null}
          </li>
        ))}
      </ul>
      {chosen.length < MOST_COSMOLOGIES ? (
        <AddCosmology chosen={chosen} onAdd={onAdd} />
      ) : (
        <p className="mt-3 text-caption text-muted">Six stand side by side; take one away to add another.</p>
      )}
    </section>
  )
}
