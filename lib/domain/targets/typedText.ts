import { z } from 'zod'

interface Read<T> {
  ok: boolean
  value?: T
  message?: string
}

/** Text that stays text in the form and is understood in the schema; an empty one means there is none. */
export function typedText<T>(read: (text: string) => Read<T>, longest = 40) {
  return z
    .string()
    .max(longest, `At most ${longest} characters fit here.`)
    .transform((text, ctx): { typed: string; value: T | null } => {
      const typed = text.trim()
      if (typed === '') return { typed: '', value: null }
      const answer = read(typed)
      if (answer.ok && answer.value !== undefined) return { typed, value: answer.value }
      ctx.addIssue({ code: 'custom', message: answer.message ?? 'This cannot be read.' })
      return z.NEVER
    })
}
