/** A night, or half of one, that a visit may have. */
export interface VisitNight {
  /** Evenings since the first of the season. */
  day: number
  /** Keys of the halves of nights it takes; nobody else may have one of them. */
  halves: readonly number[]
  /** Dark time of them, whole seconds. */
  seconds: number
  /** Of that, with some target of the proposal usable. */
  usableSeconds: number
}

/** A visit as it is asked for, with every night on which it may be. */
export interface AskedVisit {
  proposal: number
  instrument: number
  telescope: number
  /** Nights asked for, and the fewest that are of use. */
  nights: number
  least: number
  /** Whether its nights must follow one another. */
  together: boolean
  /** In the order of time, one a day at most. */
  mayBe: readonly VisitNight[]
}

export interface PlacedVisit {
  visit: AskedVisit
  nights: readonly VisitNight[]
}

export interface VisitNotPlaced {
  proposal: number
  instrument: number
  /** Not usable: even alone it finds fewer nights than are of use. */
  reason: 'no-nights' | 'nights-taken'
  /** The most nights it would find alone. */
  most: number
}

export interface VisitsPlaced {
  placed: PlacedVisit[]
  notPlaced: VisitNotPlaced[]
}
