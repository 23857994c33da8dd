import { countOffice, setDisabled } from '@/db/queries/officePeople'
import { endSessionsOf } from '@/db/queries/sessions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayDisable } from './policy'

/** Shuts an account; its sessions end at once. The office is never left without anybody. */
export async function disablePerson(ctx: ActingContext, input: { personId: number }): Promise<void> {
  authorize(mayDisable(ctx.actor, input.personId))
  await inTransaction(ctx, async (tx) => {
    if (!(await setDisabled(tx.db, input.personId, true)))
      throw refuse.closed('This account is shut already.')
    if ((await countOffice(tx.db)) === 0) throw refuse.closed('The office would be left without anybody.')
    const ended = await endSessionsOf(tx.db, input.personId, null)
    await writeLogbook(tx, {
      action: 'person.disable',
      subject: { kind: 'person', id: input.personId },
      actingAs: 'office',
      after: { sessionsEnded: ended },
    })
  })
}
