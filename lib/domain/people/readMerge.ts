import { countBelongings } from '@/db/queries/merge'
import { findPerson, findPersonByEmail } from '@/db/queries/people'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { moveWords, type MergeView } from './mergeWords'
import { mayManagePeopleOfOffice } from './policy'
import { whyNotMerge } from './whyNotMerge'

/** What would move from the account with an address to another, and what stands in the way. Nothing is changed. */
export async function readMerge(ctx: ActingContext, keepId: number, goneEmail: string): Promise<MergeView> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  const keep = await findPerson(ctx.db, keepId)
  if (!keep) throw refuse.notFound('account')
  const gone = await findPersonByEmail(ctx.db, goneEmail)
  const shown = (person: typeof keep) => ({
    id: person.id,
    name: person.name,
    email: person.email,
    institute: person.institute_text,
  })
  if (!gone) return { keep: shown(keep), gone: null, inTheWay: ['No account has this address.'], moves: [] }
  return {
    keep: shown(keep),
    gone: shown(gone),
    inTheWay: await whyNotMerge(ctx.db, keep, gone, ctx.actor.personId),
    moves: moveWords(await countBelongings(ctx.db, gone.id)),
  }
}
