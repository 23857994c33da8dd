import type { Database } from '../client.ts'

export interface PersonTraces {
  /** Proposals that name the account, drafts among them. */
  proposals: number
  /** Of these, sent ones. */
  sent: number
  reviews: number
  assessments: number
  letters: number
  lastSeenAt: Date | null
}

const one = async (rows: Promise<{ n: string | number }[]>) => Number((await rows)[0]?.n ?? 0)

/** What an account has left in the product, in numbers. */
export async function personTraces(db: Database, id: number): Promise<PersonTraces> {
  const named = () =>
    db('proposal_people as q').join('proposals as p', 'p.id', 'q.proposal_id').where('q.person_id', id)
  const [proposals, sent, reviews, assessments, letters, last] = await Promise.all([
    one(named().countDistinct<{ n: string }[]>('p.id as n')),
    one(named().whereNot('p.state', 'draft').countDistinct<{ n: string }[]>('p.id as n')),
    one(db('assignments').where('person_id', id).whereNull('withdrawn_at').count<{ n: string }[]>('* as n')),
    one(db('assessments').where('assessed_by', id).count<{ n: string }[]>('* as n')),
    one(db('outbox').where('person_id', id).count<{ n: string }[]>('* as n')),
    db('sessions').where('person_id', id).max<{ at: Date | null }[]>('last_seen_at as at'),
  ])
  return { proposals, sent, reviews, assessments, letters, lastSeenAt: last[0]?.at ?? null }
}
