'use client'

import { CheckboxField } from '@/components/forms/CheckboxField'
import { throughputParts } from '@/lib/domain/facility/modeSchema'

/** What the efficiencies count already; the rest is computed or warned of. */
export function ThroughputIncludes() {
  return (
    <fieldset className="m-0 border-0 p-0">
      <legend className="p-0 text-body font-semibold">The efficiency includes</legend>
      <p className="m-0 text-caption text-muted">
        Air and slit that it leaves out are computed; other losses it leaves out are warned of.
      </p>
      <div className="mt-2 flex flex-wrap gap-x-6 gap-y-2">
        {throughputParts.map((part) => (
          <CheckboxField key={part} name="throughputIncludes" value={part} label={part} />
        ))}
      </div>
    </fieldset>
  )
}
