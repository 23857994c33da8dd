import type { EveningHalf } from '../visits/readEvenings'

/** Time to give on one instrument. */
export interface GivenLine {
  instrumentId: number
  seconds: number
  isReserve: boolean
  service: 'queue' | 'visitor'
  conditions: string
  /** Of a visit; none in the queue. */
  evenings: readonly EveningHalf[]
}
