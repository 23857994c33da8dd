import type { Database } from '../client.ts'

/** Someone to be told about a call, with the proposals of theirs it concerns. */
export interface Told {
  personId: number | null
  email: string
  name: string
  references: string[]
}

/** Which proposals of a call a notice is for. */
export type NoticeFor =
  /** Being written, with no deadline but the call's. */
  | { notice: 'deadline' }
  /** Being written, of one kind, with no deadline of their own. */
  | { notice: 'kind-deadline'; kindId: number }
  /** All that are being written, and those sent, which may still be reopened. */
  | { notice: 'correction' }

/**
 * Everyone named on the proposals of a call that a notice is for: one entry a person, however many of the proposals
 * are theirs, and each address once.
 */
export async function whoIsTold(db: Database, callId: number, what: NoticeFor): Promise<Told[]> {
  const rows = await db('proposals as p')
    .join('proposal_people as q', 'q.proposal_id', 'p.id')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .where('p.call_id', callId)
    .where((q) => {
      void q.where('p.state', 'draft').orWhere({ 'p.state': 'submitted', 'p.is_reopened': 1 })
      if (what.notice === 'correction') void q.orWhere('p.state', 'submitted')
    })
    .modify((q) => {
      if (what.notice !== 'correction') void q.whereNull('p.closes_at')
      if (what.notice === 'deadline') void q.whereNull('k.closes_at')
      if (what.notice === 'kind-deadline') void q.where('k.id', what.kindId)
    })
    .orderBy(['p.id', 'q.position'])
    .select('q.person_id', 'q.email', 'q.name', 'p.reference')
  const told = new Map<string, Told>()
  for (const { person_id, email, name, reference } of rows) {
    const key = email.toLowerCase()
    const known = told.get(key) ?? { personId: person_id, email, name, references: [] }
    told.set(key, { ...known, references: [...known.references, reference] })
  }
  return [...told.values()]
}
