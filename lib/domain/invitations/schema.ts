import { z } from 'zod'
import { newPassword } from '../people/schema'

export const invitationRoles = ['reviewer', 'chair', 'instrument-scientist', 'office'] as const

export const inviteSchema = z
  .object({
    name: z
      .string()
      .trim()
      .min(1, 'Give the name the letter should use.')
      .max(160, 'A name has at most 160 characters.'),
    email: z
      .string()
      .trim()
      .refine(
        (text) => z.email().safeParse(text).success,
        'This does not read as an e-mail address: name@institute.org.',
      ),
    role: z.enum(invitationRoles, 'Choose a role.'),
    /** Panel for a reviewer or chair, instrument for an instrument scientist; '' for none. */
    panelId: z.string().regex(/^\d*$/, 'Choose a panel.'),
    instrumentId: z.string().regex(/^\d*$/, 'Choose an instrument.'),
  })
  .superRefine((input, context) => {
    if ((input.role === 'reviewer' || input.role === 'chair') && !input.panelId)
      context.addIssue({ code: 'custom', path: ['panelId'], message: 'Choose the panel this person joins.' })
    if (input.role === 'instrument-scientist' && !input.instrumentId)
      context.addIssue({
        code: 'custom',
        path: ['instrumentId'],
        message: 'Choose the instrument this person assesses.',
      })
  })

export const acceptInvitationSchema = z.object({
  token: z.string().min(20).max(200),
  name: z
    .string()
    .trim()
    .min(1, 'Give your name; a single name will do.')
    .max(160, 'A name has at most 160 characters.'),
  institute: z.string().trim().max(200, 'An institute has at most 200 characters.'),
  password: newPassword,
})
