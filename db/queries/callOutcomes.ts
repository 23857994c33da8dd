import type { Database } from '../client.ts'

export interface KindOutcome {
  kind: string
  state: 'awarded' | 'reserve' | 'declined'
  proposals: number
}

/** How many proposals of each kind of a call were decided which way, in the order of the kinds. */
export async function outcomesByKind(db: Database, callId: number): Promise<KindOutcome[]> {
  const rows = await db('proposals as p')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .where('p.call_id', callId)
    .whereIn('p.state', ['awarded', 'reserve', 'declined'])
    .groupBy('k.id', 'k.title', 'p.state')
    .orderBy('k.id')
    .select({ kind: 'k.title', state: 'p.state' })
    .count<{ kind: string; state: KindOutcome['state']; proposals: number | string }[]>({ proposals: '*' })
  return rows.map((row) => ({ ...row, proposals: Number(row.proposals) }))
}

/** Keys of the decided proposals of a call. */
export async function decidedProposals(db: Database, callId: number): Promise<number[]> {
  const rows = await db('proposals')
    .where({ call_id: callId })
    .whereIn('state', ['awarded', 'reserve', 'declined'])
    .orderBy('id')
    .select('id')
  return rows.map(({ id }) => id)
}
