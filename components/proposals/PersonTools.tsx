'use client'

import { ArrowDown, ArrowUp } from 'lucide-react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { accessOptions } from './accessOptions'
import type { PeopleActions } from './peopleActions'
import { useDeed } from './useDeed'

export interface PersonToolsProps {
  reference: string
  person: { id: number; name: string; access: 'read' | 'edit' | 'deputy' }
  isFirst: boolean
  isLast: boolean
  actions: PeopleActions
}

const arrow =
  'flex h-8 w-8 items-center justify-center rounded border border-edge hover:bg-wash aria-disabled:border-dashed aria-disabled:text-muted max-sm:h-11 max-sm:w-11'

/** What the principal investigator can do with one name: rights, order, off. */
export function PersonTools({ reference, person, isFirst, isLast, actions }: PersonToolsProps) {
  const { busy, run } = useDeed()
  const move = (by: -1 | 1) => () => run(() => actions.move({ reference, id: person.id, by }))
  return (
    <div className="flex flex-wrap items-center gap-3 self-start text-table" aria-busy={busy || undefined}>
      <select
        aria-label={`What ${person.name} may do`}
        value={person.access}
        onChange={(event) => {
          const access = event.target.value as typeof person.access
          run(() => actions.setAccess({ reference, id: person.id, access }))
        }}
        className="min-h-8 rounded border border-edge bg-surface px-2 text-table max-sm:min-h-11 max-sm:w-full"
      >
        {accessOptions.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      <button
        type="button"
        className={arrow}
        aria-label={`Move ${person.name} up`}
        aria-disabled={isFirst || undefined}
        onClick={isFirst ? undefined : move(-1)}
      >
        <ArrowUp size={16} aria-hidden="true" />
      </button>
      <button
        type="button"
        className={arrow}
        aria-label={`Move ${person.name} down`}
        aria-disabled={isLast || undefined}
        onClick={isLast ? undefined : move(1)}
      >
        <ArrowDown size={16} aria-hidden="true" />
      </button>
      <LinkLikeButton
        aria-label={`Take ${person.name} off`}
        onClick={() => run(() => actions.remove({ reference, id: person.id }), `${person.name} is taken off`)}
      >
        Take off
      </LinkLikeButton>
    </div>
  )
}
