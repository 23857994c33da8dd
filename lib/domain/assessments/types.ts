import type { Verdict } from '../observations/types'

export const assessmentVerdicts = ['accepted', 'change', 'not-possible'] as const
export type AssessmentVerdict = (typeof assessmentVerdicts)[number]

export interface Assessment {
  id: number
  verdict: AssessmentVerdict
  trueSeconds: number
  reason: string
  panelNote: string
  assessedAt: Date
  supersededAt: Date | null
}

/** A question to the investigators and what they answered, without names either way. */
export interface StaffQuestion {
  id: number
  instrument: string
  question: string
  askedAt: Date
  dueAt: Date
  answer: string | null
  answeredAt: Date | null
}

/** What the panel and the investigators read of an instrument's assessment. */
export interface InstrumentAssessment {
  instrumentId: number
  instrument: string
  verdict: AssessmentVerdict
  trueSeconds: number
  reason: string
  assessedAt: Date
}

/** One request in the table of an instrument scientist. */
export interface RequestLine {
  requestId: number
  callNumber: number
  instrumentId: number
  instrument: string
  reviewNumber: string
  title: string
  targets: number
  modes: string
  askedSeconds: number
  computedSeconds: number
  trueSeconds: number | null
  verdict: Verdict | null
  assessed: AssessmentVerdict | null
  assessedAt: string | null
  reason: string
  passedAt: string | null
  /** The panel ranks or has decided: nothing is assessed or passed on any more. */
  isSettled: boolean
  /** A question waits for its answer, or one came since the last assessment. */
  question: 'none' | 'asked' | 'answered'
}
