import { z } from 'zod'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky'
import { numberBetween, readable } from './texts'

export const seasonSchema = z.object({
  ra: readable(parseRightAscension),
  dec: readable(parseDeclination),
  airmass: numberBetween('An airmass', 1, 3),
})

export type SeasonInput = z.input<typeof seasonSchema>
