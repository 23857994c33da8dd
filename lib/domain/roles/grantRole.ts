import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { findPerson } from '@/db/queries/people'
import { holdsAlready } from '@/db/queries/roleGrants'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { roleWords } from '../invitations/roleWords'
import { writeLogbook } from '../logbook/writeLogbook'
import { roleGiven } from '../outbox/letters/roleGiven'
import { queueLetter } from '../outbox/queueLetter'
import { mayManagePeopleOfOffice } from '../people/policy'
import { findScope } from './findScope'
import { giveRole } from './giveRole'
import type { grantRoleSchema } from './schema'

const moment = (text: string) => (text ? new Date(text) : null)

/** Gives an account a role between two dates; its owner is told by letter. Returns the seat taken on a panel. */
export async function grantRole(
  ctx: ActingContext,
  input: z.output<typeof grantRoleSchema>,
): Promise<{ seat: 'chair' | 'deputy' | 'member' | null }> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const person = await findPerson(tx.db, input.personId)
    if (!person) throw refuse.notFound('account')
    if (person.disabled_at) throw refuse.closed('This account is shut. Open it again first.')
    const untilAt = moment(input.untilAt)
    if (untilAt && untilAt <= (await databaseNow(tx.db)))
      throw refuse.field('untilAt', 'This moment has passed already.')
    const { where, ...scope } = await findScope(tx.db, input)
    const wanted = { personId: person.id, role: input.role, ...scope }
    if (await holdsAlready(tx.db, wanted))
      throw refuse.field(
        'role',
        `${person.name} has this role there already. End it first to change its dates.`,
      )
    const fromAt = moment(input.fromAt)
    const seat = await giveRole(tx, { ...wanted, fromAt, untilAt, grantedBy: tx.actor.personId })
    await queueLetter(
      tx,
      { personId: person.id, email: person.email, name: person.name },
      roleGiven({
        name: person.name,
        role: roleWords[input.role],
        where,
        fromAt,
        untilAt,
        url: tx.request.origin + paths.account(),
      }),
      `role-given:${person.id}:${tx.request.id}`,
    )
    await writeLogbook(tx, {
      action: 'role.grant',
      subject: { kind: 'person', id: person.id },
      actingAs: 'office',
      after: { role: input.role, ...scope, seat, from: input.fromAt || 'now', until: input.untilAt || null },
    })
    return { seat }
  })
}
