'use client'

import { useFormState, useWatch } from 'react-hook-form'
import type { z } from 'zod'
import { BarNote } from '@/components/ui/BarNote'
import { offeredTwiceWords } from '@/lib/domain/calendar/offeredTwiceWords'
import type { setNightsSchema } from '@/lib/domain/calendar/schema'
import type { TelescopeCalendar } from '@/lib/domain/calendar/types'

/** Says before anything is sent that another call offers one of the nights chosen for science. */
export function OfferedElsewhere({ telescope }: { telescope: TelescopeCalendar }) {
  const { from = '', to = '', parts = [] } = useWatch<z.input<typeof setNightsSchema>>()
  const { errors } = useFormState<z.input<typeof setNightsSchema>>()
  const nights = telescope.nights.filter(({ date }) => date >= from && date <= to)
  const wanted = nights.flatMap(({ date }) =>
    parts.map((part) => ({
      eveningDate: date,
      from: Number(part.from),
      to: Number(part.to),
      useFor: part.useFor ?? 'science',
    })),
  )
  const sentence = offeredTwiceWords(telescope.name, wanted, telescope.elsewhere)
  // Once it was refused it stands at its field.
  return sentence && !errors.from ? (
    <BarNote tone="lamp">
      <p className="m-0">{sentence}</p>
    </BarNote>
  ) : null
}
