import type { NightUse } from '../calls/nightUseList'
import type { Call } from '../calls/types'
import type { NightElsewhere } from './nightElsewhere'

/** A part of a night as it is set: fractions of the dark time, what it is for, and the instrument mounted. */
export interface NightPart {
  from: number
  to: number
  useFor: NightUse
  instrumentId: number | null
  note: string
}

export interface CalendarNight {
  /** Date of the evening. */
  date: string
  /** Dark time of the whole night, seconds. */
  darkSeconds: number
  /** Illuminated fraction of the Moon at the middle of the night, 0 to 1. */
  moonLit: number
  /** In the order of the night; what no part covers is not on offer. */
  parts: (NightPart & { darkSeconds: number })[]
}

/** Seconds of a stretch of nights by what they are for. */
export interface UseTotals {
  darkSeconds: number
  scienceSeconds: number
  /** Of the science, bound to one instrument. */
  boundSeconds: number
  engineeringSeconds: number
  promisedSeconds: number
  freeSeconds: number
}

export interface HalfMonth extends UseTotals {
  /** First and last evening that fall into it. */
  from: string
  to: string
  nights: number
}

export interface TelescopeCalendar {
  id: number
  name: string
  instruments: { id: number; name: string }[]
  nights: CalendarNight[]
  /** What other calls offer of these nights. */
  elsewhere: NightElsewhere[]
  halves: HalfMonth[]
  total: UseTotals
  /** Awarded in the call on its instruments, reserves apart: what science time cannot fall below. */
  awardedSeconds: number
}

export interface NightCalendar {
  call: Pick<Call, 'number' | 'slug' | 'title' | 'version' | 'seasonFrom' | 'seasonTo'>
  /** Why nothing can be set any more; null while it can. */
  whyNot: string | null
  telescopes: TelescopeCalendar[]
}
