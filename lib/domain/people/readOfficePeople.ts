import { listOpenInvitations, listPeople } from '@/db/queries/officePeople'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import type { OfficePeopleReply } from './officeSchema'
import { mayManagePeopleOfOffice } from './policy'

/** Everyone with an account, and the invitations still open. */
export async function readOfficePeople(ctx: ActingContext): Promise<OfficePeopleReply> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  const [people, invitations] = await Promise.all([listPeople(ctx.db), listOpenInvitations(ctx.db)])
  return {
    people: people.map(({ confirmedAt, disabledAt, addressFailedAt, erasureAskedAt, ...person }) => ({
      ...person,
      isConfirmed: confirmedAt !== null,
      isDisabled: disabledAt !== null,
      addressFails: addressFailedAt !== null,
      asksToBeErased: erasureAskedAt !== null,
    })),
    invitations: invitations.map((line) => ({ ...line, expiresAt: line.expiresAt.toISOString() })),
  }
}
