import { z } from 'zod'
import { commonPasswords } from './commonPasswords'
import { orcid } from './orcid'

const email = z
  .string()
  .trim()
  .max(254, 'An address has at most 254 characters.')
  .refine((text) => text.length > 0, 'Give your e-mail address.')
  .refine(
    (text) => text.length === 0 || z.email().safeParse(text).success,
    'This does not read as an e-mail address: name@institute.org.',
  )

/** Length decides, as NIST SP 800-63B-4 has it: no rules of composition, nothing on the lists of stolen ones. */
export const newPassword = z
  .string()
  .max(200, 'A password has at most 200 characters.')
  .refine((text) => text.length >= 12, 'Take at least 12 characters; a few words in a row do well.')
  .refine(
    (text) => !commonPasswords.has(text.toLowerCase()),
    'This password stands on lists of stolen ones. Take another.',
  )

const personName = z
  .string()
  .trim()
  .min(1, 'Give your name; a single name will do.')
  .max(160, 'A name has at most 160 characters.')
  .refine((text) => !/[\r\n\t<>]/.test(text), 'A name is one line of text.')

export const registerSchema = z.object({
  name: personName,
  email,
  institute: z.string().trim().max(200, 'An institute has at most 200 characters.'),
  password: newPassword,
})

export const forgotPasswordSchema = z.object({ email })

export const signInSchema = z.object({ email, password: z.string().min(1, 'Give your password.') })

export const resetPasswordSchema = z.object({ token: z.string().min(20).max(200), password: newPassword })

export const tokenSchema = z.object({ token: z.string().min(20).max(200) })

export const profileSchema = z.object({
  name: personName,
  institute: z.string().trim().max(200, 'An institute has at most 200 characters.'),
  orcid,
  careerStage: z.enum(['', 'student', 'postdoc', 'staff', 'emeritus', 'other']),
  timeZone: z
    .string()
    .refine(
      (zone) => Intl.supportedValuesOf('timeZone').includes(zone) || zone === 'UTC',
      'Choose a time zone from the list.',
    ),
  version: z.number().int().positive(),
})

export const changePasswordSchema = z.object({
  current: z.string().min(1, 'Give your present password.'),
  password: newPassword,
})

export const erasureRequestSchema = z.object({ isAsked: z.boolean() })
