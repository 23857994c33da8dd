import { z } from 'zod'
import { newPassword } from '../people/schema'
import { requireScope, roleScope } from '../roles/schema'

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
    ...roleScope,
  })
  .superRefine(requireScope)

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
