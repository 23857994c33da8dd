/** Time asked against time on offer in one class of a breakdown, seconds. */
export interface Pressure {
  name: string
  askedSeconds: number
  /** Null where it is shared with others, as of instruments on one telescope. */
  offeredSeconds: number | null
}

/** How the proposals of a call came in: how many had arrived, so many days before its deadline. */
export interface Arrivals {
  callNumber: number
  /** Days before the deadline, negative, growing; proposals arrived by then. */
  points: [days: number, proposals: number][]
}

export interface CallComparison {
  callNumber: number
  slug: string
  season: { from: string; to: string }
  proposals: number
  askedSeconds: number
  offeredSeconds: number
}

export interface FeeSums {
  currency: string
  billedMinor: number
  paidMinor: number
  waivedMinor: number
  owedMinor: number
}

/** A count of people; null where it is too small to be told. */
export interface PeopleCount {
  name: string
  count: number | null
}

export interface CallFigures {
  call: { number: number; slug: string; title: string }
  arrivals: Arrivals[]
  calls: CallComparison[]
  byTelescope: Pressure[]
  byInstrument: Pressure[]
  byHalfMonth: Pressure[]
  bySidereal: Pressure[]
  byMoon: Pressure[]
  /** Asked for targets and conditions that no night on offer serves, seconds. */
  unservedSeconds: number
  fees: FeeSums | null
  leads: PeopleCount[]
}
