'use client'

import { Popover } from '@/components/ui/Popover'
import { linkClasses } from '@/components/ui/linkClasses'
import { quantities } from '@/lib/domain/tools/yardstick/quantities'
import { MOST_COLUMNS } from '@/lib/domain/tools/yardstick/state'
import type { CosmologyQuantity } from '@/lib/science/cosmology'
import { HeadOf } from './HeadOf'

export interface ColumnChoiceProps {
  columns: readonly CosmologyQuantity[]
  onChange: (columns: CosmologyQuantity[]) => void
}

/** Which quantities the table shows, in the order of the list; one to eight. */
export function ColumnChoice({ columns, onChange }: ColumnChoiceProps) {
  const full = columns.length >= MOST_COLUMNS
  const toggle = (id: CosmologyQuantity) => {
    const next = columns.includes(id) ? columns.filter((one) => one !== id) : [...columns, id]
    const order = quantities.map((quantity) => quantity.id)
    onChange(next.sort((a, b) => order.indexOf(a) - order.indexOf(b)))
  }
  return (
    <Popover
      label="Choose columns"
      trigger={
        <button type="button" className={`${linkClasses} max-sm:min-h-11`}>
          Choose columns
        </button>
      }
    >
      <fieldset className="m-0 max-h-[min(26rem,60vh)] overflow-y-auto border-0 p-0">
        <legend className="mb-2 p-0 text-caption text-muted">
          {full ? 'Eight columns fit; take one away for another.' : 'One to eight columns a cosmology.'}
        </legend>
        {quantities.map(({ id, name, head, below, unit }) => {
          const on = columns.includes(id)
          const only = on && columns.length === 1
          return (
            <label
              key={id}
              className="flex min-h-9 items-center gap-3 border-t border-rule py-1 max-sm:min-h-11"
            >
              <input
                type="checkbox"
                className="checkbox"
                checked={on}
                disabled={only || (full && !on)}
                onChange={() => toggle(id)}
              />
              <span className="grow">{name}</span>
              <span className="text-right text-caption text-muted">
                {head === name ? null : <HeadOf head={head} below={below} />} {unit}
              </span>
            </label>
          )
        })}
      </fieldset>
    </Popover>
  )
}
