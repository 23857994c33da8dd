import { findCallBySlug } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import {
  judgesOf,
  namedBefore,
  namedInCall,
  recordConflict,
  recordDeclaration,
  recordedConflicts,
} from '@/db/queries/conflicts'
import { lockAssignmentsOf, withdrawAssignment } from '@/db/queries/assignmentsRead'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { interestsToRecord } from './interestsToRecord'
import { listNames } from './listNames'
import { canDeclareInterests } from './policy'
import type { DeclareInterestsInput } from './schema'
import { RECENT_CALLS } from './types'
import { writeToLeaders } from './writeToLeaders'

export interface Declared {
  callSlug: string
  /** How many assignments were taken back because of it. */
  withdrawn: number
}

/**
 * Records what a reviewer said of the names of a call, finds the own proposals, those of
 * people named with them on recent ones and those of the own institute, and
 * takes back every assignment they touch; whoever leads the panel is told. It may be said again later; what was
 * declared once stays.
 */
export function declareInterests(ctx: ActingContext, input: DeclareInterestsInput): Promise<Declared> {
  return inTransaction(ctx, async (tx) => {
    const call = await findCallBySlug(tx.db, input.callSlug)
    if (!call) throw refuse.notFound('call')
    authorize(canDeclareInterests(tx.actor, call, await databaseNow(tx.db)))
    const me = tx.actor.personId
    const assignments = await lockAssignmentsOf(tx.db, me, call.id)
    const [named, before, judges, recorded] = await Promise.all([
      namedInCall(tx.db, call.id),
      namedBefore(tx.db, call.id, [me], RECENT_CALLS),
      judgesOf(tx.db, [me]),
      recordedConflicts(tx.db, call.id, [me]),
    ])
    const judge = judges[0] ?? { personId: me, institutes: [] }
    const declared = recorded.filter(({ source }) => source === 'declared')
    const listed = new Map(listNames(call.id, named, judge, declared, before).map((name) => [name.key, name]))

    const ticked = input.names.map(({ key, kind }) => {
      const name = listed.get(key)
      if (!name)
        throw refuse.invalid(
          'The list of names has changed. Load the page again and go through it once more.',
        )
      return { person: name.person, kind: name.declaredAs ?? kind }
    })
    // What was declared before is said again, so that its words are not lost when a second name joins it.
    const again = [...listed.values()].flatMap(({ key, person, declaredAs }) =>
      declaredAs && !input.names.some((name) => name.key === key) ? [{ person, kind: declaredAs }] : [],
    )
    const interests = interestsToRecord(judge, named, [...again, ...ticked], before)
    for (const interest of interests) await recordConflict(tx.db, interest)
    await recordDeclaration(tx.db, me, call.id)

    const barred = new Set([...interests, ...recorded].map(({ proposalId }) => proposalId))
    const hit = assignments.filter((assignment) => barred.has(assignment.proposalId))
    for (const assignment of hit) {
      await withdrawAssignment(tx.db, assignment.id, 'An interest was declared')
      await writeLogbook(tx, {
        action: 'declareInterests.withdraw',
        actingAs: 'reviewer',
        subject: { kind: 'assignment', id: assignment.id },
        after: { withdrawn: true },
      })
    }
    await writeToLeaders(tx, call, hit)
    await writeLogbook(tx, {
      action: 'declareInterests',
      actingAs: 'reviewer',
      subject: { kind: 'call', id: call.id },
      after: { names: ticked.length, proposals: barred.size, assignmentsWithdrawn: hit.length },
    })
    return { callSlug: call.slug, withdrawn: hit.length }
  })
}
