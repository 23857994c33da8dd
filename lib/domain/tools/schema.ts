import { z } from 'zod'
import { cosmologyPresets } from '@/lib/science/cosmology'
import { parseMagnitude } from '@/lib/science/magnitude'
import { parseRedshift } from '@/lib/science/redshift'
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

const presetId = z
  .string()
  .refine((id) => cosmologyPresets.some((preset) => preset.id === id), 'Choose a cosmology.')

/** Redshifts one a line, and up to three cosmologies. */
export const yardstickSchema = z.object({
  z: z
    .string()
    .max(20_000, 'That is more than the page holds.')
    .superRefine((text, context) => {
      const lines = text.split(/[\s,;]+/).filter(Boolean)
      if (lines.length === 0) context.addIssue({ code: 'custom', message: 'Give a redshift, one a line.' })
      if (lines.length > 1000)
        context.addIssue({ code: 'custom', message: 'At most 1,000 redshifts at once.' })
      for (const line of lines.slice(0, 1000)) {
        const answer = parseRedshift(line)
        if (answer.ok) continue
        context.addIssue({ code: 'custom', message: `${line}: ${answer.message}` })
        break
      }
    }),
  first: presetId,
  second: z.union([z.literal(''), presetId]),
  third: z.union([z.literal(''), presetId]),
})

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

export type YardstickInput = z.input<typeof yardstickSchema>
export type SeasonInput = z.input<typeof seasonSchema>
export type ExposureInput = z.input<typeof exposureSchema>
