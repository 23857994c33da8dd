import { z } from 'zod'
import { readNumber } from '@/lib/science/redshift'
import type { NightsView } from './nightsView'
import type { Trial } from './trialSchema'

const amount = (what: string, most: number, unit: string) =>
  z
    .string()
    .trim()
    .transform((text, ctx): number | null => {
      if (text === '') return null
      const value = readNumber(text)
      if (value !== null && value >= 0 && value <= most) return value
      ctx.addIssue({ code: 'custom', message: `${what} lies between 0 and ${most}\u00a0${unit}.` })
      return z.NEVER
    })

/** What to try, as typed; empty for what stands. */
export const trialFormSchema = z.object({
  lost: amount('The share of nights lost', 100, '%'),
  telescopes: z.array(
    z.object({
      id: z.number(),
      offered: amount('The share of the nights', 200, '%'),
      held: amount('What is held back', 10_000, 'h'),
    }),
  ),
})
export type TrialForm = z.input<typeof trialFormSchema>

/** A trial as the form holds it. */
export function trialTyped(trial: Trial | undefined, telescopes: NightsView['telescopes']): TrialForm {
  const typed = (value: number | undefined) => (value === undefined ? '' : String(value))
  return {
    lost: typed(trial?.lostPercent),
    telescopes: telescopes.map(({ id }) => ({
      id,
      offered: typed(trial?.offeredPercent?.[id]),
      held: typed(trial?.heldHours?.[id]),
    })),
  }
}

/** The trial a form asks for; choices tried before stay in it. */
export function trialFrom(form: z.output<typeof trialFormSchema>, choices: Trial['choices']): Trial {
  const named = (of: (one: (typeof form)['telescopes'][number]) => number | null) =>
    Object.fromEntries(
      form.telescopes.flatMap((one) => {
        const value = of(one)
        return value === null ? [] : [[String(one.id), value]]
      }),
    )
  return {
    ...(form.lost === null ? {} : { lostPercent: form.lost }),
    offeredPercent: named(({ offered }) => offered),
    heldHours: named(({ held }) => held),
    ...(choices ? { choices } : {}),
  }
}
