/** Half of the dark time of a night on one telescope. Moments in milliseconds. */
export interface NightHalf {
  telescope: number
  /** Date of the evening. */
  date: string
  half: 'first' | 'second'
  from: number
  to: number
  /** Dark time in it, whole seconds. */
  seconds: number
}

/** A visit with the halves of nights it has, in the order of time. */
export interface DatedVisit {
  proposal: number
  instrument: number
  telescope: number
  seconds: number
  halves: readonly NightHalf[]
}
