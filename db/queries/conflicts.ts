import type { Knex } from 'knex'
import type { BarredPair, Judge, NamedInvestigator } from '../../lib/domain/conflicts/types.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

const sentStates = ['submitted', 'under-review', 'awarded', 'reserve', 'declined'] as const

/** Everyone named on the sent proposals of a call: as they were when it was sent, and as they are named now. */
export function namedInCall(db: Database, callId: number): Promise<NamedInvestigator[]> {
  return namedOn(db, (proposals) => proposals.where('p.call_id', callId))
}

/**
 * Everyone on the sent proposals of recent calls that name one of these people: of the `calls` that opened last before
 * this one closed.
 */
export async function namedBefore(
  db: Database,
  callId: number,
  personIds: readonly number[],
  calls: number,
): Promise<NamedInvestigator[]> {
  const recent = await db('calls')
    .whereNot({ id: callId })
    .where('opens_at', '<=', db('calls').where({ id: callId }).select('closes_at'))
    .orderBy([{ column: 'opens_at', order: 'desc' }, { column: 'id' }])
    .limit(calls)
    .select('id')
  if (recent.length === 0) return []
  const emails = db('people').whereIn('id', personIds).select('email')
  const asSent = db('proposal_version_people as w')
    .join('proposal_versions as x', 'x.id', 'w.proposal_version_id')
    .whereIn('w.person_id', personIds)
    .whereNull('x.superseded_at')
    .select('x.proposal_id')
  const asNamed = db('proposal_people')
    .where((q) =>
      q.whereIn('person_id', personIds).orWhere((w) => w.whereNull('person_id').whereIn('email', emails)),
    )
    .select('proposal_id')
  const ids = recent.map(({ id }) => id)
  return namedOn(db, (proposals) =>
    proposals.whereIn('p.call_id', ids).andWhere((q) => q.whereIn('p.id', asSent).orWhereIn('p.id', asNamed)),
  )
}

async function namedOn(
  db: Database,
  narrow: (proposals: Knex.QueryBuilder) => Knex.QueryBuilder,
): Promise<NamedInvestigator[]> {
  const asSent = db('proposal_version_people as q')
    .join('proposal_versions as v', 'v.id', 'q.proposal_version_id')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .leftJoin('people as a', 'a.id', 'q.person_id')
    .modify((q) => void narrow(q))
    .whereIn('p.state', sentStates)
    .whereNull('v.superseded_at')
    .orderBy(['v.proposal_id', 'q.position'])
    .select<NamedInvestigator[]>(
      'v.proposal_id as proposalId',
      'q.person_id as personId',
      'q.name',
      'a.sort_name as sortName',
      'q.institute',
    )
  // Someone named by address who has opened an account since is that person.
  const asNamed = db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .leftJoin('people as a', (on) =>
      on.on('a.id', 'q.person_id').orOn((either) => either.onNull('q.person_id').on('a.email', 'q.email')),
    )
    .modify((q) => void narrow(q))
    .whereIn('p.state', sentStates)
    .orderBy(['q.proposal_id', 'q.position'])
    .select<NamedInvestigator[]>(
      'q.proposal_id as proposalId',
      'a.id as personId',
      'q.name',
      'a.sort_name as sortName',
      'q.institute',
    )
  return [...(await asSent), ...(await asNamed)]
}

/** Reviewers, chairs and members of the panels of a call. */
export async function panelPeople(db: Database, callId: number): Promise<number[]> {
  const panels = db('panels').where({ call_id: callId }).select('id')
  const granted = await db('role_grants')
    .whereIn('role', ['reviewer', 'chair'])
    .whereNull('revoked_at')
    .andWhere((q) =>
      q
        .where((scope) =>
          scope.whereNull('panel_id').andWhere((c) => c.whereNull('call_id').orWhere({ call_id: callId })),
        )
        .orWhereIn('panel_id', panels.clone()),
    )
    .distinct<{ person_id: number }[]>('person_id')
  const seated = await db('panel_members')
    .whereIn('panel_id', panels)
    .whereNull('left_at')
    .select('person_id')
  return [...new Set([...granted, ...seated].map((row) => row.person_id))]
}

/** People with the institutes they belong to, for matching. */
export async function judgesOf(db: Database, personIds: readonly number[]): Promise<Judge[]> {
  const rows = await db('people as a')
    .leftJoin('institutes as i', 'i.id', 'a.institute_id')
    .whereIn('a.id', personIds)
    .select<{ id: number; institute: string | null; typed: string }[]>(
      'a.id',
      'i.name as institute',
      'a.institute_text as typed',
    )
  return rows.map((row) => ({
    personId: row.id,
    institutes: [row.institute, row.typed].filter((name): name is string => Boolean(name)),
  }))
}

/** Interests on record that bar someone now. */
export function recordedConflicts(
  db: Database,
  callId: number,
  personIds: readonly number[],
): Promise<(BarredPair & { note: string })[]> {
  return db('conflicts as c')
    .join('proposals as p', 'p.id', 'c.proposal_id')
    .where({ 'p.call_id': callId, 'c.severity': 'barred' })
    .whereIn('c.person_id', personIds)
    .andWhere((q) => q.whereNull('c.until_at').orWhere('c.until_at', '>', db.raw('UTC_TIMESTAMP(3)')))
    .orderBy('c.id')
    .select<(BarredPair & { note: string })[]>(
      'c.person_id as personId',
      'c.proposal_id as proposalId',
      'c.kind',
      'c.source',
      'c.note',
    )
}

/** Records an interest; the same one again keeps the newer words. */
export async function recordConflict(db: Database, pair: BarredPair & { note: string }): Promise<void> {
  await db('conflicts')
    .insert({
      person_id: pair.personId,
      proposal_id: pair.proposalId,
      kind: pair.kind,
      severity: 'barred',
      source: pair.source,
      note: pair.note.slice(0, 300),
      decided_by: pair.source === 'declared' ? pair.personId : null,
      from_at: utcNow(db),
    })
    .onConflict(['person_id', 'proposal_id', 'kind', 'source'])
    .merge({ note: pair.note.slice(0, 300), severity: 'barred', until_at: null })
}

export async function declarationOf(db: Database, personId: number, callId: number): Promise<Date | null> {
  const row = await db('interest_declarations').where({ person_id: personId, call_id: callId }).first()
  return row?.declared_at ?? null
}

export async function recordDeclaration(db: Database, personId: number, callId: number): Promise<void> {
  const now = utcNow(db)
  await db('interest_declarations')
    .insert({ person_id: personId, call_id: callId, declared_at: now })
    .onConflict(['person_id', 'call_id'])
    .merge({ declared_at: now })
}

/** When the last proposal arrived after the call's own deadline, by an exception; null when none did. */
export async function lastLateArrival(db: Database, callId: number): Promise<Date | null> {
  const row = await db('proposal_versions as v')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('c.id', callId)
    .whereNull('v.superseded_at')
    .andWhereRaw('v.arrived_at > c.closes_at')
    .max<{ last: Date | null } | undefined>({ last: 'v.committed_at' })
    .first()
  return row?.last ?? null
}
