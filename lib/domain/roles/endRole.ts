import { countOffice } from '@/db/queries/officePeople'
import { fitSeatToRoles, unfinishedReviews } from '@/db/queries/panelSeats'
import { findGrant, revokeGrant } from '@/db/queries/roleGrants'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayManagePeopleOfOffice } from '../people/policy'

/**
 * Ends a role at once: the next page asked for already knows. The seat on the panel follows; what was scored stays.
 * Returns how many reviews are left unfinished, which the chair has to give to others.
 */
export async function endRole(
  ctx: ActingContext,
  input: { grantId: number },
): Promise<{ unfinished: number }> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const grant = await findGrant(tx.db, input.grantId)
    if (!grant) throw refuse.notFound('role')
    if (grant.role === 'investigator')
      throw refuse.closed('Every account is an investigator’s. Shut the account instead.')
    if (grant.role === 'office' && grant.personId === tx.actor.personId)
      throw refuse.closed('You cannot end the role you act in.')
    if (!(await revokeGrant(tx.db, grant.id))) throw refuse.closed('This role has ended already.')
    if (grant.role === 'office' && (await countOffice(tx.db)) === 0)
      throw refuse.closed('The office would be left without anybody.')
    let unfinished = 0
    if (grant.panelId !== null) {
      await fitSeatToRoles(tx.db, grant.panelId, grant.personId)
      if (grant.role === 'reviewer')
        unfinished = await unfinishedReviews(tx.db, grant.panelId, grant.personId)
    }
    await writeLogbook(tx, {
      action: 'role.end',
      subject: { kind: 'person', id: grant.personId },
      actingAs: 'office',
      before: { role: grant.role, panelId: grant.panelId, instrumentId: grant.instrumentId },
      after: { unfinishedReviews: unfinished },
    })
    return { unfinished }
  })
}
