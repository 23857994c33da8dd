import { z } from 'zod'
import { refuse } from '@/lib/errors'
import { skyEngineVersion, visibility, type Night } from '@/lib/science/sky'
import { asRefused } from './asRefused'
import { mostNights, mostTargets, requireAtMost } from './limits'
import { evening, requireOwnIds, siteInput, targetInput } from './skySchema'

const twilights = { astronomical: -18, nautical: -12, civil: -6 } as const

export const visibilityRequest = z.object({
  site: siteInput,
  targets: z.array(targetInput),
  from: evening,
  to: evening,
  maxAirmass: z
    .number()
    .min(1, 'An airmass lies between 1 and 30.')
    .max(30, 'An airmass lies between 1 and 30.'),
  twilight: z.enum(['astronomical', 'nautical', 'civil']).default('astronomical'),
  moon: z
    .object({
      maxIllumination: z.number().min(0).max(1).optional(),
      minSeparationDeg: z.number().min(0).max(180).optional(),
      below: z.boolean().optional(),
    })
    .optional(),
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
  requireAtMost(targets, mostTargets, 'targets')
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
