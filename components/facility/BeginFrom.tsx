'use client'

import { ChevronDown } from 'lucide-react'
import { useId, useState } from 'react'
import { controlClasses } from '@/components/forms/controlClasses'
import { Button } from '@/components/ui/Button'
import type { ModeTyped } from '@/lib/domain/facility/modeForm'
import type { CarrierChoice } from './carrierOptions'

type Pattern = CarrierChoice & { typed: ModeTyped }

export interface BeginFromProps {
  patterns: readonly Pattern[]
  onFill: (typed: ModeTyped) => void
}

/** The record of another mode as a beginning: it fills the fields below, and nothing is saved by it. */
export function BeginFrom({ patterns, onFill }: BeginFromProps) {
  const id = useId()
  const [slug, setSlug] = useState(patterns[0]?.slug ?? '')
  const [filled, setFilled] = useState<Pattern | null>(null)
  const chosen = patterns.find((one) => one.slug === slug)
  const groups = [...new Set(patterns.map(({ group }) => group))]
  return (
    <div>
      <label htmlFor={id} className="block text-body font-semibold">
        Begin from another mode <span className="font-normal text-muted">(optional)</span>
      </label>
      <p id={`${id}-help`} className="m-0 text-caption text-muted">
        Its record replaces what stands in the fields below; name, short name and instrument stay.
      </p>
      <div className="mt-2 flex flex-wrap items-center gap-3">
        <div className="relative w-full max-w-md">
          <select
            id={id}
            value={slug}
            aria-describedby={`${id}-help`}
            onChange={(event) => setSlug(event.target.value)}
            className={`${controlClasses(false, false)} appearance-none pr-9`}
          >
            {groups.map((group) => (
              <optgroup key={group} label={group}>
                {patterns
                  .filter((one) => one.group === group)
                  .map((one) => (
                    <option key={one.slug} value={one.slug}>
                      {one.name}
                    </option>
                  ))}
              </optgroup>
            ))}
          </select>
          <ChevronDown
            size={16}
            aria-hidden="true"
            className="pointer-events-none absolute top-1/2 right-3 -translate-y-1/2"
          />
        </div>
        <Button
          size="small"
          look="secondary"
          onClick={() => {
            if (!chosen) return
            onFill(chosen.typed)
            setFilled(chosen)
          }}
        >
          Fill the fields with it
        </Button>
      </div>
      <p role="status" className="mt-2 text-table text-muted">
        {filled ? `The fields hold the record of ${filled.name} now. Change what differs.` : ''}
      </p>
    </div>
  )
}
