import type { StaffQuestion } from '../../lib/domain/assessments/types.ts'
import type { Database } from '../client.ts'
import { utcIn, utcNow } from '../utcNow.ts'

export interface QuestionRow extends StaffQuestion {
  requestId: number
  proposalId: number
  askedBy: number
}

const questions = (db: Database) =>
  db('assessment_questions as q')
    .join('assessment_requests as r', 'r.id', 'q.request_id')
    .join('instruments as i', 'i.id', 'r.instrument_id')
    .select({
      id: 'q.id',
      requestId: 'q.request_id',
      proposalId: 'r.proposal_id',
      instrument: 'i.name',
      question: 'q.question',
      askedBy: 'q.asked_by',
      askedAt: 'q.asked_at',
      dueAt: 'q.due_at',
      answer: 'q.answer',
      answeredAt: 'q.answered_at',
    })

export function questionsOfRequests(db: Database, requestIds: readonly number[]): Promise<QuestionRow[]> {
  return questions(db).whereIn('q.request_id', requestIds).orderBy('q.id')
}

export function questionsOfProposal(db: Database, proposalId: number): Promise<QuestionRow[]> {
  return questions(db).where('r.proposal_id', proposalId).orderBy('q.id')
}

export async function lockQuestion(db: Database, id: number): Promise<QuestionRow | null> {
  await db('assessment_questions').where({ id }).forUpdate().first('id')
  const row: QuestionRow | undefined = await questions(db).where('q.id', id).first()
  return row ?? null
}

export async function insertQuestion(
  db: Database,
  given: { requestId: number; question: string; personId: number; withinDays: number },
): Promise<number> {
  const [id = 0] = await db('assessment_questions').insert({
    request_id: given.requestId,
    question: given.question,
    asked_by: given.personId,
    asked_at: utcNow(db),
    due_at: utcIn(db, given.withinDays * 86_400),
  })
  return id
}

export async function answerOnce(
  db: Database,
  id: number,
  answer: string,
  personId: number,
): Promise<boolean> {
  const count = await db('assessment_questions')
    .where({ id })
    .whereNull('answered_at')
    .update({
      answer,
      answered_by: personId,
      answered_at: utcNow(db),
    })
  return count === 1
}
