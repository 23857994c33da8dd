import type { NightUse } from './nightUseList'

/** A part of a night of one telescope, and what it is for. */
export interface NightBlock {
  telescopeId: number
  /** The instrument mounted; null where any may be used. */
  instrumentId: number | null
  /** Date of the evening the night begins on. */
  eveningDate: string
  useFor: NightUse
  /** Part of the dark time, fractions from 0 to 1. */
  from: number
  to: number
  /** To whom it is promised, or what is done. */
  note: string
  /** Dark time of the part, whole seconds, computed from the real sky. */
  darkSeconds: number
}
