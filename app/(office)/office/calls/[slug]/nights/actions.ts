'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { importNights } from '@/lib/domain/calendar/importNights'
import { importNightsSchema, setNightsSchema } from '@/lib/domain/calendar/schema'
import { setNights } from '@/lib/domain/calendar/setNights'
import { paths } from '@/lib/paths'

const pages = (_: unknown, { slug }: { slug: string }) => [
  paths.officeCallPage(slug, 'nights'),
  paths.call(slug),
]

export const setNightsAction = defineAction({
  name: 'setNights',
  schema: setNightsSchema,
  run: setNights,
  revalidate: pages,
})

export const importNightsAction = defineAction({
  name: 'importNights',
  schema: importNightsSchema,
  run: importNights,
  revalidate: pages,
  limit: { points: 20, seconds: 600 },
})
