import { z } from 'zod'
import { parseMagnitude } from '@/lib/science/magnitude'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky'

type Read = (text: string) => { ok: true } | { ok: false; message: string }

/** Text that stays text: whether it can be read is said at the field, and the page reads it again. */
const readable = (read: Read) =>
  z
    .string()
    .trim()
    .max(60)
    .superRefine((text, context) => {
      const answer = read(text)
      if (!answer.ok) context.addIssue({ code: 'custom', message: answer.message })
    })

const numberBetween = (what: string, low: number, high: number) =>
  z
    .string()
    .trim()
    .refine((text) => /^\d+([.,]\d+)?$/.test(text), `${what} is a number.`)
    .refine((text) => {
      const value = Number(text.replace(',', '.'))
      return Number.isNaN(value) || (value >= low && value <= high)
    }, `${what} lies between ${low} and ${high}.`)

export const seasonSchema = z.object({
  ra: readable(parseRightAscension),
  dec: readable(parseDeclination),
  airmass: numberBetween('An airmass', 1, 3),
})

export const exposureSchema = z.object({
  mode: z.string().min(1, 'Choose a mode.').max(60),
  magnitude: readable(parseMagnitude),
  snr: numberBetween('A signal-to-noise', 1, 10_000),
  moon: z.enum(['dark', 'grey', 'bright']),
  airmass: numberBetween('An airmass', 1, 3),
  seeing: numberBetween('An image quality', 0.3, 4),
})

export type SeasonInput = z.input<typeof seasonSchema>
export type ExposureInput = z.input<typeof exposureSchema>
