import type { Verdict } from '../observations/types'

export const audiences = ['investigators', 'panel', 'private'] as const
export type Audience = (typeof audiences)[number]

/** A criterion on one reviewer's sheet; scores are kept in half points, 0 to 20. */
export interface SheetCriterion {
  id: number
  title: string
  prompt: string
  weight: number
  halfPoints: number | null
}

export interface SheetText {
  audience: Audience
  body: string
  /** 0 while nothing is stored. */
  version: number
}

export type ReviewState = 'to-read' | 'begun' | 'finished'

/** One of a reviewer's own assignments, as tables and the strip show it. */
export interface ReviewLine {
  assignmentId: number
  callSlug: string
  callNumber: number
  reviewNumber: string
  title: string
  askedSeconds: number
  instruments: string
  verdict: Verdict | null
  score: number | null
  state: ReviewState
  dueAt: string
}

/** Scores by half point, 21 counts. */
export interface ScaleUse {
  own: number[]
  /** The other readers of the panel together; null where they are not shown. */
  others: number[] | null
  /** Why not; empty where they are. */
  whyAlone: string
}
