import { setDisabled } from '@/db/queries/officePeople'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayManagePeopleOfOffice } from './policy'

/** Opens a shut account again. */
export async function enablePerson(ctx: ActingContext, input: { personId: number }): Promise<void> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    if (!(await setDisabled(tx.db, input.personId, false)))
      throw refuse.closed('This account is open already.')
    await writeLogbook(tx, {
      action: 'person.enable',
      subject: { kind: 'person', id: input.personId },
      actingAs: 'office',
    })
  })
}
