import { z } from 'zod'

/** Roles the office gives; investigator is everyone with an account. */
const givenRoles = ['reviewer', 'chair', 'instrument-scientist', 'office'] as const

const moment = z
  .string()
  .refine(
    (text) => text === '' || z.iso.datetime().safeParse(text).success,
    'Give a date and a time, or leave both empty.',
  )

/** What a role is for: a panel for reviewer and chair, an instrument for an instrument scientist. */
export const roleScope = {
  role: z.enum(givenRoles, 'Choose a role.'),
  /** Panel for a reviewer or chair, instrument for an instrument scientist; '' for none. */
  panelId: z.string().regex(/^\d*$/, 'Choose a panel.'),
  instrumentId: z.string().regex(/^\d*$/, 'Choose an instrument.'),
  /** '' for no end. */
  untilAt: moment,
}

type Scope = { role: string; panelId: string; instrumentId: string }

/** Says at its field what a role is missing. */
export function requireScope(input: Scope, context: z.RefinementCtx): void {
  if ((input.role === 'reviewer' || input.role === 'chair') && !input.panelId)
    context.addIssue({ code: 'custom', path: ['panelId'], message: 'Choose the panel this person joins.' })
  if (input.role === 'instrument-scientist' && !input.instrumentId)
    context.addIssue({
      code: 'custom',
      path: ['instrumentId'],
      message: 'Choose the instrument this person assesses.',
    })
}

export const grantRoleSchema = z
  .object({
    personId: z.number().int().positive(),
    ...roleScope,
    /** '' for now. */
    fromAt: moment,
  })
  .superRefine((input, context) => {
    requireScope(input, context)
    if (input.fromAt && input.untilAt && input.untilAt <= input.fromAt)
      context.addIssue({
        code: 'custom',
        path: ['untilAt'],
        message: 'The role would end before it begins.',
      })
  })

export const endRoleSchema = z.object({ grantId: z.number().int().positive() })
