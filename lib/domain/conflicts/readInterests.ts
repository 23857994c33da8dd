import { findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { declarationOf, judgesOf, namedBefore, namedInCall, recordedConflicts } from '@/db/queries/conflicts'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Call } from '../calls/types'
import type { ActingContext } from '../context'
import { listNames } from './listNames'
import { canDeclareInterests } from './policy'
import { RECENT_CALLS, type ListedName } from './types'

export interface InterestsView {
  call: Pick<Call, 'slug' | 'number' | 'title' | 'reviewsDueAt'>
  declaredAt: Date | null
  names: ListedName[]
}

/** The names a reviewer goes through before any proposal is opened; nothing here tells who stands on what. */
export async function readInterests(ctx: ActingContext, callSlug: string): Promise<InterestsView> {
  const call = await findCallBySlug(ctx.db, callSlug)
  if (!call) throw refuse.notFound('call')
  authorize(canDeclareInterests(ctx.actor, call, await databaseNow(ctx.db)))
  const me = ctx.actor.personId
  const [declaredAt, named, before, judges, recorded] = await Promise.all([
    declarationOf(ctx.db, me, call.id),
    namedInCall(ctx.db, call.id),
    namedBefore(ctx.db, call.id, [me], RECENT_CALLS),
    judgesOf(ctx.db, [me]),
    recordedConflicts(ctx.db, call.id, [me]),
  ])
  const judge = judges[0] ?? { personId: me, institutes: [] }
  const declared = recorded.filter(({ source }) => source === 'declared')
  return {
    call: { slug: call.slug, number: call.number, title: call.title, reviewsDueAt: call.reviewsDueAt },
    declaredAt,
    names: listNames(call.id, named, judge, declared, before).map(
      ({ key, name, institute, foundAs, declaredAs }) => ({
        key,
        name,
        institute,
        foundAs,
        declaredAs,
      }),
    ),
  }
}
