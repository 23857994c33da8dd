'use client'

import { useState } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { NightCalendar, TelescopeCalendar } from '@/lib/domain/calendar/types'
import { formatHoursFromSeconds } from '@/lib/format'
import { HalfMonthTable } from './HalfMonthTable'
import { NightGrid, type ChosenNights } from './NightGrid'
import { NightsForm, type NightsInput } from './NightsForm'

interface TelescopeSeasonProps {
  call: NightCalendar['call']
  telescope: TelescopeCalendar
  /** Null where the nights stay as they are. */
  action: FormAction<NightsInput, unknown> | null
}

/** One telescope's season: the grid, the form for the nights chosen in it, and its sums. */
export function TelescopeSeason({ call, telescope, action }: TelescopeSeasonProps) {
  const [chosen, setChosen] = useState<ChosenNights | null>(null)
  const [anchor, setAnchor] = useState<string | null>(null)
  const { name, total, awardedSeconds, halves } = telescope
  const choose = (date: string, extend: boolean) => {
    const start = extend && anchor ? anchor : date
    setAnchor(start)
    setChosen(start <= date ? { from: start, to: date } : { from: date, to: start })
  }
  const awarded = awardedSeconds > 0 ? `, ${formatHoursFromSeconds(awardedSeconds)} of it awarded` : ''
  return (
    <section className="mt-12">
      <SectionHeading
        title={name}
        aside={`${formatHoursFromSeconds(total.scienceSeconds)} for science${awarded}, ${formatHoursFromSeconds(total.promisedSeconds)} promised, ${formatHoursFromSeconds(total.engineeringSeconds)} for engineering, of ${formatHoursFromSeconds(total.darkSeconds)} dark`}
      />
      <div className="mt-4">
        <NightGrid telescope={telescope} chosen={chosen} onChoose={choose} />
      </div>
      {action ? (
        <div className="mt-5">
          {chosen ? (
            <div className="border-t-4 border-accent bg-surface p-5 max-sm:p-4">
              <NightsForm
                key={`${chosen.from} ${chosen.to}`}
                call={{ slug: call.slug, version: call.version }}
                telescope={telescope}
                chosen={chosen}
                action={action}
              />
            </div>
          ) : (
            <p className="m-0 text-table text-muted">
              Choose a night to set it; with Shift a stretch of nights. Arrow keys move, too.
            </p>
          )}
        </div>
      ) : null}
      <div className="mt-6">
        <HalfMonthTable
          name={name}
          halves={halves}
          fileName={`half-months-${call.slug}-${name.toLowerCase()}`}
        />
      </div>
    </section>
  )
}
