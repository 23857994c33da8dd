import { databaseNow } from '@/db/queries/clock'
import { findPerson } from '@/db/queries/people'
import { personTraces } from '@/db/queries/personFacts'
import { grantsOfPerson } from '@/db/queries/roleGrants'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { standingOfRole } from '../roles/rules'
import type { PersonView } from './personView'
import { mayManagePeopleOfOffice } from './policy'

const iso = (at: Date | null) => at?.toISOString() ?? null

/** One account with its roles, past ones among them, and what it has left in the product. */
export async function readOfficePerson(ctx: ActingContext, personId: number): Promise<PersonView> {
  authorize(mayManagePeopleOfOffice(ctx.actor))
  const person = await findPerson(ctx.db, personId)
  if (!person) throw refuse.notFound('account')
  const [grants, traces, now, other] = await Promise.all([
    grantsOfPerson(ctx.db, personId),
    personTraces(ctx.db, personId),
    databaseNow(ctx.db),
    person.merged_into_id === null ? null : findPerson(ctx.db, person.merged_into_id),
  ])
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    institute: person.institute_text,
    orcid: person.orcid,
    createdAt: person.created_at.toISOString(),
    confirmedAt: iso(person.email_confirmed_at),
    disabledAt: iso(person.disabled_at),
    addressFailedAt: iso(person.address_failed_at),
    addressFailedWhy: person.address_failed_why,
    erasureAskedAt: iso(person.erasure_asked_at),
    erasedAt: iso(person.erased_at),
    mergedInto: other ? { id: other.id, name: other.name } : null,
    traces: { ...traces, lastSeenAt: iso(traces.lastSeenAt) },
    grants: grants.map((grant) => ({
      id: grant.id,
      role: grant.role,
      call: grant.call,
      panel: grant.panel,
      instrument: grant.instrument,
      fromAt: grant.fromAt.toISOString(),
      untilAt: iso(grant.untilAt),
      grantedBy: grant.grantedBy,
      stands: standingOfRole(grant, now),
    })),
  }
}
