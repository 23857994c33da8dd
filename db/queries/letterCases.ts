import type { Database } from '../client.ts'
import type { DecisionsRow, ProposalsRow } from '../tables.ts'
import { moneyOfLetter, type LetterMoney } from './letterMoney.ts'

export interface CaseLine {
  reference: string
  title: string
  state: ProposalsRow['state']
  call: number
}

/** Proposals a letter can be tried on, the newest first. */
export const letterCases = (db: Database, limit: number): Promise<CaseLine[]> =>
  db('proposals as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .orderBy('p.id', 'desc')
    .limit(limit)
    .select({ reference: 'p.reference', title: 'p.title', state: 'p.state', call: 'c.number' })

export interface LetterCase extends LetterMoney {
  reference: string
  title: string
  reviewNumber: string | null
  lead: string
  /** A second investigator; null where one person asks alone. */
  second: string | null
  call: { number: number; title: string; slug: string; closesAt: Date; reviewsDueAt: Date }
  chair: string | null
  version: { number: number; arrivedAt: Date; sha256: string } | null
  decision: {
    outcome: DecisionsRow['outcome']
    lines: { instrument: string; seconds: number; isReserve: boolean; conditions: string }[]
  } | null
  question: { instrument: string; question: string; answer: string | null; dueAt: Date } | null
}

const orNull = <T>(row: T | undefined): T | null => row ?? null

async function decisionOf(db: Database, proposalId: number): Promise<LetterCase['decision']> {
  const decision = await db('decisions')
    .where({ proposal_id: proposalId })
    .whereNull('superseded_at')
    .whereNotNull('released_at')
    .first('id', 'outcome')
  if (!decision) return null
  const lines = await db('award_lines as a')
    .join('instruments as i', 'i.id', 'a.instrument_id')
    .where('a.decision_id', decision.id)
    .whereNull('a.superseded_at')
    .orderBy('a.id')
    .select<{ instrument: string; seconds: number; reserve: 0 | 1; conditions: string }[]>({
      instrument: 'i.name',
      seconds: 'a.seconds',
      reserve: 'a.is_reserve',
      conditions: 'a.conditions',
    })
  return {
    outcome: decision.outcome,
    lines: lines.map(({ reserve, ...line }) => ({ ...line, isReserve: reserve === 1 })),
  }
}

const questionOf = (db: Database, proposalId: number) =>
  db('assessment_questions as q')
    .join('assessment_requests as r', 'r.id', 'q.request_id')
    .join('instruments as i', 'i.id', 'r.instrument_id')
    .where('r.proposal_id', proposalId)
    .orderBy('q.id', 'desc')
    .first<NonNullable<LetterCase['question']> | undefined>({
      instrument: 'i.name',
      question: 'q.question',
      answer: 'q.answer',
      dueAt: 'q.due_at',
    })

/** All that letters tell of one proposal, as it stands; null when there is no such proposal. */
export async function findLetterCase(db: Database, reference: string): Promise<LetterCase | null> {
  const proposal = await db('proposals as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('p.reference', reference)
    .first<
      | {
          id: number
          title: string
          review_number: string | null
          panel_id: number | null
          number: number
          call_title: string
          slug: string
          closesAt: Date
          reviewsDueAt: Date
        }
      | undefined
    >({
      id: 'p.id',
      title: 'p.title',
      review_number: 'p.review_number',
      panel_id: 'p.panel_id',
      number: 'c.number',
      call_title: 'c.title',
      slug: 'c.slug',
      closesAt: 'c.closes_at',
      reviewsDueAt: 'c.reviews_due_at',
    })
  if (!proposal) return null
  const [people, version, money, decision, question, chair] = await Promise.all([
    db('proposal_people').where({ proposal_id: proposal.id }).orderBy('position').select('name', 'role'),
    db('proposal_versions')
      .where({ proposal_id: proposal.id })
      .orderBy('version_number', 'desc')
      .first({ number: 'version_number', arrivedAt: 'arrived_at', sha256: 'snapshot_sha256' }),
    moneyOfLetter(db, proposal.id),
    decisionOf(db, proposal.id),
    questionOf(db, proposal.id),
    db('panel_members as m')
      .join('people as a', 'a.id', 'm.person_id')
      .where({ 'm.panel_id': proposal.panel_id ?? 0, 'm.seat': 'chair' })
      .first<{ name: string } | undefined>('a.name'),
  ])
  return {
    reference,
    title: proposal.title,
    reviewNumber: proposal.review_number,
    lead: people.find((person) => person.role === 'pi')?.name ?? '',
    second: people.find((person) => person.role !== 'pi')?.name ?? null,
    call: {
      number: proposal.number,
      title: proposal.call_title,
      slug: proposal.slug,
      closesAt: proposal.closesAt,
      reviewsDueAt: proposal.reviewsDueAt,
    },
    chair: chair?.name ?? null,
    version: orNull(version) as LetterCase['version'],
    ...money,
    decision,
    question: orNull(question),
  }
}
