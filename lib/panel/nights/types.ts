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
