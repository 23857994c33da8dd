import { z } from 'zod'
import { choiceOrRank } from './choiceWords'

const key = z.string().regex(/^[1-9]\d{0,9}$/)
const percent = (most: number) => z.number().min(0).max(most)

/** What a division is tried under; whatever is not named stays as it stands. Telescopes and proposals by their keys. */
export const trialSchema = z.object({
  /** Nights lost all through the season, per cent, instead of the record's. */
  lostPercent: percent(100).optional(),
  /** Share of a telescope's dark time on offer, per cent; above 100 for more nights than the call has. */
  offeredPercent: z.record(key, percent(200)).optional(),
  heldHours: z.record(key, z.number().min(0).max(10_000)).optional(),
  choices: z.record(key, choiceOrRank).optional(),
})
export type Trial = z.output<typeof trialSchema>

/** A trial as it stands in an address. */
export const trialText = z
  .string()
  .max(8000)
  .transform((text, ctx): Trial => {
    try {
      const read = trialSchema.safeParse(JSON.parse(text))
      if (read.success) return read.data
    } catch {
      // Said below.
    }
    ctx.addIssue({ code: 'custom', message: 'This trial cannot be read.' })
    return z.NEVER
  })

/** Whether anything is tried at all. */
export const isTried = (trial: Trial | undefined): boolean =>
  trial !== undefined &&
  (trial.lostPercent !== undefined ||
    [trial.offeredPercent, trial.heldHours, trial.choices].some(
      (tried) => Object.keys(tried ?? {}).length > 0,
    ))
