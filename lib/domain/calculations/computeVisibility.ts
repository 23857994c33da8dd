import { z } from 'zod'
import { refuse } from '@/lib/errors'
import { skyEngineVersion, visibility, type Night } from '@/lib/science/sky'
import { asRefused } from './asRefused'
import { exactly } from './exactly'
import { listOf, mostNights, mostTargets } from './limits'
import { evening, requireOwnIds, siteInput, targetInput } from './skySchema'

const number = z.number('This is a number.')

const twilights = { astronomical: -18, nautical: -12, civil: -6 } as const

export const visibilityRequest = exactly({
  site: siteInput,
  targets: listOf(targetInput, mostTargets, 'targets'),
  from: evening,
  to: evening,
  maxAirmass: number.min(1, 'An airmass lies between 1 and 30.').max(30, 'An airmass lies between 1 and 30.'),
  twilight: z
    .enum(['astronomical', 'nautical', 'civil'], 'Twilight is astronomical, nautical or civil.')
    .default('astronomical'),
  moon: exactly({
    maxIllumination: number
      .min(0, 'A share lies between 0 and 1.')
      .max(1, 'A share lies between 0 and 1.')
      .optional(),
    minSeparationDeg: number
      .min(0, 'A separation lies between 0° and 180°.')
      .max(180, 'A separation lies between 0° and 180°.')
      .optional(),
    below: z.boolean('This is true or false.').optional(),
  }).optional(),
})

export type VisibilityRequest = z.output<typeof visibilityRequest>

function requireSeason(from: string, to: string): void {
  const nights = (Date.parse(to) - Date.parse(from)) / 86_400_000 + 1
  if (nights < 1) throw refuse.field('to', 'The last evening lies before the first.')
  if (nights > mostNights)
    throw refuse.tooLarge(`${nights} nights were asked for; one call takes at most ${mostNights}.`)
}

const iso = (at: Date | null) => at?.toISOString() ?? null

function nightOf(night: Night, twilight: keyof typeof twilights) {
  return {
    date: night.date,
    sunset: iso(night.sunset),
    eveningTwilight: iso(night.eveningTwilight[twilight]),
    morningTwilight: iso(night.morningTwilight[twilight]),
    sunrise: iso(night.sunrise),
    darkHours: night.darkHours,
    moonIllumination: night.moonIllumination,
  }
}

/** When targets can be observed, night by night. */
export function computeVisibility(input: VisibilityRequest) {
  const { site, targets, from, to, maxAirmass, twilight, moon } = input
  requireOwnIds(targets)
  requireSeason(from, to)
  const found = asRefused('from', () =>
    visibility({ site, targets, from, to, maxAirmass, twilightLimitDeg: twilights[twilight], moon }),
  )
  return {
    engine: skyEngineVersion,
    nights: found.nights.map((night) => nightOf(night, twilight)),
    targets: found.targets.map(({ id, totalHours, byNight, windows }) => ({
      id,
      totalHours,
      byNight,
      windows: windows.map((pieces) =>
        pieces.map(([start, end]) => [start.toISOString(), end.toISOString()]),
      ),
    })),
  }
}
