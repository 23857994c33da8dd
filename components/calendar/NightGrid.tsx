'use client'

import { useRef, type KeyboardEvent } from 'react'
import type { TelescopeCalendar } from '@/lib/domain/calendar/types'
import { NightCell } from './NightCell'
import { nightMove } from './nightMove'
import { nightWords } from './nightWords'

export interface ChosenNights {
  from: string
  to: string
}

interface NightGridProps {
  telescope: Pick<TelescopeCalendar, 'name' | 'nights' | 'instruments' | 'elsewhere'>
  chosen: ChosenNights | null
  /** `extend`: from the nights chosen before to this one. */
  onChoose: (date: string, extend: boolean) => void
}

const days = Array.from({ length: 31 }, (_, index) => index + 1)
const monthName = new Intl.DateTimeFormat('en-GB', { month: 'long', year: 'numeric', timeZone: 'UTC' })
const shortName = new Intl.DateTimeFormat('en-GB', { month: 'short', year: '2-digit', timeZone: 'UTC' })

/**
 * A season of one telescope, a row a month and a column a day. Arrow keys move night by night and month by month; with
 * Shift they choose a stretch.
 */
export function NightGrid({ telescope, chosen, onChoose }: NightGridProps) {
  const { name, nights, instruments, elsewhere } = telescope
  const frame = useRef<HTMLDivElement>(null)
  const months = [...new Set(nights.map(({ date }) => date.slice(0, 7)))]
  const isChosen = (date: string) => chosen !== null && date >= chosen.from && date <= chosen.to
  const home = chosen?.from ?? nights[0]?.date

  const move = (event: KeyboardEvent) => {
    const from = (event.target as HTMLElement).dataset.night
    const to = from ? nightMove(nights, from, event.key) : null
    if (!to) return
    event.preventDefault()
    frame.current?.querySelector<HTMLElement>(`[data-night="${to}"]`)?.focus()
    onChoose(to, event.shiftKey)
  }

  return (
    <div ref={frame} className="overflow-x-auto" onKeyDown={move}>
      <table className="w-full min-w-[1080px] table-fixed border-collapse" aria-label={`Nights of ${name}`}>
        <thead>
          <tr>
            <th scope="col" className="sticky left-0 w-32 bg-ground max-sm:w-16">
              <span className="sr-only">Month</span>
            </th>
            {days.map((day) => (
              <th key={day} scope="col" className="text-tick font-normal text-muted">
                {day}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {months.map((month) => (
            <tr key={month} className="border-t border-rule">
              <th scope="row" className="sticky left-0 z-10 bg-ground text-left text-table font-normal">
                <span className="max-sm:hidden">{monthName.format(new Date(`${month}-01T00:00:00Z`))}</span>
                <span className="sm:hidden">{shortName.format(new Date(`${month}-01T00:00:00Z`))}</span>
              </th>
              {days.map((day) => {
                const night = nights.find(({ date }) => date === `${month}-${String(day).padStart(2, '0')}`)
                return (
                  <td key={day} className="p-0">
                    {night ? (
                      <NightCell
                        night={night}
                        instruments={instruments}
                        elsewhere={elsewhere.filter(({ eveningDate }) => eveningDate === night.date)}
                        label={nightWords(night, instruments, elsewhere)}
                        chosen={isChosen(night.date)}
                        tabbable={night.date === home}
                        onChoose={(extend) => onChoose(night.date, extend)}
                      />
                    ) : null}
                  </td>
                )
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
