import { z } from 'zod'
import { countInWords } from '@/lib/format'
import { readNumber } from '@/lib/science/redshift'
import type { TargetGroup } from '../proposals/types'

/** What a group says: its own words and the keys of its targets. */
export type GroupGiven = Omit<TargetGroup, 'id' | 'version'> & { targetIds: number[] }

const fields = z.object({
  name: z
    .string()
    .transform((text) => text.trim().replace(/\s+/g, ' '))
    .pipe(z.string().min(1, 'Give the group a name.').max(120, 'A name has at most 120 characters.')),
  rule: z.enum(['all', 'at-least', 'backup']),
  /** Typed; read only where the rule asks for it. */
  atLeast: z.string().trim().max(10),
  hoursFor: z.enum(['all', 'at-least']),
  targetIds: z
    .array(z.string().regex(/^\d{1,9}$/))
    .min(1, 'Put at least one target into it.')
    .max(500),
})

/** What is wrong with the number of targets that must be done; null when nothing is. */
function atLeastProblem(text: string, of: number): string | null {
  const value = readNumber(text)
  if (text === '' || value === null) return 'Say how many of them must be done, in figures.'
  if (!Number.isInteger(value)) return 'Targets are counted in whole numbers.'
  if (value < 1) return 'At least one of them must be done.'
  if (value <= of) return null
  return of === 1
    ? 'Only one target is in it, so no more than one can be wanted.'
    : `Only ${countInWords(of, 'target')} are in it, so no more than ${countInWords(of, '', '').trim()} can be wanted.`
}

/** A group as its form gives it: text in, a group and the keys of its targets out. */
export const groupSchema = fields
  .superRefine(({ rule, atLeast, targetIds }, ctx) => {
    const problem = rule === 'at-least' ? atLeastProblem(atLeast, new Set(targetIds).size) : null
    if (problem) ctx.addIssue({ code: 'custom', path: ['atLeast'], message: problem })
  })
  .transform(({ name, rule, atLeast, hoursFor, targetIds }): GroupGiven => {
    const isShared = rule === 'at-least'
    return {
      ...{ name, rule },
      atLeast: isShared ? readNumber(atLeast) : null,
      hoursFor: isShared ? hoursFor : 'all',
      targetIds: [...new Set(targetIds.map(Number))],
    }
  })

export type GroupRow = z.input<typeof groupSchema>
