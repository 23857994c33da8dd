import type { NightChoice } from '../decisions/choiceWords'

/** Time of one target laid into one bin. */
export interface PlannedPiece {
  /** First and last evening of the half-month on which the call has time of the bin. */
  fromEvening: string
  toEvening: string
  siderealFromH: number
  moon: 'dark' | 'grey' | 'bright'
  seconds: number
  /** Which of its night a visit has; null in the queue. */
  ofNight: 'whole' | 'first half' | 'second half' | null
  /** First and last moment of such time. */
  from: Date
  to: Date
}

/** One target with one mode of an award. */
export interface PlannedPart {
  /** Of the proposal as its reader knows it: review number or reference, never both. */
  number: string
  title: string
  rank: number | null
  choice: NightChoice | null
  telescope: string
  site: string
  instrumentId: number
  instrument: string
  mode: { name: string; fromA: number; toA: number; resolvingPower: number | null } | null
  /** Null for a visit, whose observers choose among their targets. */
  observationId: number | null
  target: { name: string; raDeg: number | null; decDeg: number | null } | null
  service: 'queue' | 'visitor'
  conditions: string
  isReserve: boolean
  seconds: number
  /** Where it is laid; less than `seconds` in all where it finds no place. */
  pieces: PlannedPiece[]
  givenAt: Date
}

export interface NightPlan {
  callNumber: number
  callSlug: string
  /** Rises with every change of any of its decisions: one award given moves others. */
  version: number
  parts: PlannedPart[]
}
