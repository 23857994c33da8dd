import { z } from 'zod'
import { rowKey } from '../panels/schema'

const reason = z
  .string()
  .trim()
  .min(10, 'Give the reason in a sentence: chairs and office read it.')
  .max(300, 'At most 300 characters.')

const percent = z
  .string()
  .trim()
  .regex(/^\d{1,3}$/, 'Give a whole percent, 0 to 100.')
  .transform(Number)
  .refine((value) => value <= 100, 'At most 100 percent.')

export const shareRuleSchema = z
  .object({
    callId: rowKey,
    rule: z.enum(['hours', 'proposals', 'fixed'], 'Choose how the time is shared.'),
    /** Of each panel; looked at only where the rule is fixed. */
    percents: z.array(z.object({ panelId: rowKey, percent: z.string() })).max(40),
    reason,
  })
  .transform((given, ctx) => {
    if (given.rule !== 'fixed') return { ...given, percents: [] }
    const percents = given.percents.map((one, index) => {
      const read = percent.safeParse(one.percent)
      if (read.success) return { panelId: one.panelId, percent: read.data }
      const message = read.error.issues[0]?.message ?? 'Give a whole percent.'
      ctx.addIssue({ code: 'custom', message, path: ['percents', index, 'percent'] })
      return { panelId: one.panelId, percent: 0 }
    })
    const sum = percents.reduce((total, one) => total + one.percent, 0)
    if (sum !== 100 && ctx.issues.length === 0)
      ctx.addIssue({
        code: 'custom',
        message: `The percents add up to ${sum}; they must add up to 100.`,
        path: ['percents', 0, 'percent'],
      })
    return { ...given, percents }
  })
export type ShareRuleInput = z.output<typeof shareRuleSchema>

export const bringTogetherSchema = z.object({ callId: rowKey })
export type BringTogetherInput = z.output<typeof bringTogetherSchema>

/** Names the list as it was on screen, so that two chairs never move over one another. */
export const mergedKeySchema = z.object({ callId: rowKey, listId: rowKey, version: rowKey })
export type MergedKeyInput = z.output<typeof mergedKeySchema>

export const mergeMoveSchema = mergedKeySchema.extend({
  proposalId: rowKey,
  place: z
    .string()
    .trim()
    .regex(/^\d{1,4}$/, 'Give the place as a whole number.')
    .transform(Number)
    .refine((place) => place > 0, 'The first place is 1.'),
  reason,
})
export type MergeMoveInput = z.output<typeof mergeMoveSchema>
