import type { z } from 'zod'

/** What the address asks, over the usual values; anything unreadable falls back to those, with the message. */
export function askedOf<Input extends Record<string, string>, Output>(
  schema: z.ZodType<Output, Input>,
  usual: Input,
  query: Record<string, string | string[] | undefined>,
): { asked: Input; trouble: string | null } {
  const given = Object.fromEntries(
    Object.keys(usual).flatMap((key) => {
      const value = [query[key]].flat()[0]
      return value === undefined ? [] : [[key, value]]
    }),
  )
  const asked = { ...usual, ...given }
  const result = schema.safeParse(asked)
  return result.success
    ? { asked, trouble: null }
    : { asked: usual, trouble: result.error.issues[0]?.message ?? 'This address cannot be read.' }
}
