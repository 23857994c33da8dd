import { z } from 'zod'
import { restLines } from '@/lib/science/light'
import { typedNumber } from '../targets/typedNumber'

const key = z.number().int().positive()

const required = (schema: ReturnType<typeof typedNumber>, message: string) =>
  schema.transform(({ value }, ctx): number => {
    if (value !== null) return value
    ctx.addIssue({ code: 'custom', message })
    return z.NEVER
  })

/** Hours as typed, one decimal or more, kept as whole seconds. */
export const hoursAsSeconds = required(
  typedNumber('A time', 0, 2000),
  'Say how many hours you ask for; 0 while you do not know.',
).transform((hours) => Math.round(hours * 3600))

const cells = z.object({
  targetId: key,
  modeId: key,
  /** Conditions asked for; null takes the proposal's first set, made now when there is none. */
  constraintSetId: key.nullable(),
  wantedSnr: required(typedNumber('A signal-to-noise', 0.1, 100_000), 'Say what signal-to-noise you want.'),
  snrPer: z.enum(['image', 'pixel', 'angstrom', 'resolution-element']),
  /** A line of the list by its id, 'own' for one of one's own, or empty. */
  feature: z.string().max(40),
  ownName: z.string().trim().max(40, 'A feature’s name has at most 40 characters.'),
  ownRestA: typedNumber('A rest wavelength', 10, 1_000_000),
  askedHours: hoursAsSeconds,
})

/** One row of the observations table: text as typed in, what is kept out. */
export const observationRowSchema = cells.transform(({ feature, ownName, ownRestA, ...row }, ctx) => {
  const kept = { ...row, askedSeconds: row.askedHours }
  if (feature === '') return { ...kept, feature: null, featureRestA: null }
  if (feature !== 'own') {
    const line = restLines.find(({ id }) => id === feature)
    if (line) return { ...kept, feature: line.name, featureRestA: line.vacuumA }
    ctx.addIssue({ code: 'custom', path: ['feature'], message: 'This feature is not on the list.' })
    return z.NEVER
  }
  if (ownName === '') ctx.addIssue({ code: 'custom', path: ['ownName'], message: 'Name the feature.' })
  if (ownRestA.value === null)
    ctx.addIssue({ code: 'custom', path: ['ownRestA'], message: 'Give its rest wavelength in vacuum, Å.' })
  return { ...kept, feature: ownName, featureRestA: ownRestA.value }
})

export type ObservationRow = z.input<typeof observationRowSchema>
export type ObservationRowValues = z.output<typeof observationRowSchema>
