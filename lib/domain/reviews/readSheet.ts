import { callCriteria } from '@/db/queries/calls'
import { lastSaved, reviewTexts, standingScores } from '@/db/queries/reviews'
import type { Database } from '@/db/client'
import { audiences, type SheetCriterion, type SheetText } from './types'

export interface Sheet {
  criteria: SheetCriterion[]
  texts: SheetText[]
  savedAt: Date | null
}

/** The score sheet of an assignment as it stands; a text never written is empty at version 0. */
export async function readSheet(db: Database, callId: number, assignmentId: number): Promise<Sheet> {
  const [criteria, scores, texts, savedAt] = await Promise.all([
    callCriteria(db, callId),
    standingScores(db, [assignmentId]),
    reviewTexts(db, assignmentId),
    lastSaved(db, assignmentId),
  ])
  const scored = scores.get(assignmentId)
  return {
    criteria: criteria.map(({ id, title, prompt, weight }) => ({
      id,
      title,
      prompt,
      weight,
      halfPoints: scored?.get(id) ?? null,
    })),
    texts: audiences.map((audience) => {
      const text = texts.find((stored) => stored.audience === audience)
      return { audience, body: text?.body ?? '', version: text?.version ?? 0 }
    }),
    savedAt,
  }
}
