import { z } from 'zod'

const instant = z.iso.datetime()
const role = z.object({
  role: z.string(),
  call: z.number().nullable(),
  panel: z.string().nullable(),
  instrument: z.string().nullable(),
})

/** One account in the office's table. */
export const officePersonRow = z.object({
  id: z.number(),
  name: z.string(),
  email: z.string(),
  institute: z.string(),
  isConfirmed: z.boolean(),
  isDisabled: z.boolean(),
  /** A mail server refused the address for good. */
  addressFails: z.boolean(),
  asksToBeErased: z.boolean(),
  roles: z.array(role),
})

export const openInvitationRow = z.object({
  id: z.number(),
  name: z.string(),
  email: z.string(),
  role: z.string(),
  panel: z.string().nullable(),
  call: z.number().nullable(),
  instrument: z.string().nullable(),
  expiresAt: instant,
})

export const officePeopleReply = z.object({
  people: z.array(officePersonRow),
  invitations: z.array(openInvitationRow),
})

export const personStepSchema = z.object({ personId: z.number().int().positive() })
export const mergeSchema = z.object({
  keepId: z.number().int().positive(),
  goneId: z.number().int().positive(),
})
export const invitationStepSchema = z.object({ invitationId: z.number().int().positive() })

export type OfficePersonRow = z.output<typeof officePersonRow>
export type OpenInvitationRow = z.output<typeof openInvitationRow>
export type OfficePeopleReply = z.output<typeof officePeopleReply>
