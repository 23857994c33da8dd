/** What a proposal asks of one instrument, and what bears on giving it. */
export interface AskedLine {
  proposal: number
  instrument: number
  telescope: number
  /** Seconds that would do the whole of it: as assessed where assessed, else as asked. */
  seconds: number
  /** Least award that is still of use, seconds. */
  least: number
  /** False where the instrument scientist called it not possible. */
  possible: boolean
}

export interface GivenLine {
  proposal: number
  instrument: number
  telescope: number
  seconds: number
}

export interface NotGiven {
  proposal: number
  instrument: number
  reason: 'not-possible' | 'too-little-left'
  /** Seconds left on the telescope when its turn came. */
  left: number
}

export interface NightsPlan {
  given: GivenLine[]
  notGiven: NotGiven[]
}

/** Anything that divides hours on offer among proposals in ranking order. */
export type NightsPolicy = (input: {
  /** In ranking order, those above the line first. */
  asked: readonly (readonly AskedLine[])[]
  /** How many of them stand above the line. */
  line: number
  /** Telescope to seconds on offer. */
  offered: ReadonlyMap<number, number>
}) => NightsPlan
