export type Seat = 'first' | 'second' | 'reader'

/** A proposal to be read: how long it is, and who may not read it. */
export interface ToRead {
  id: number
  pages: number
  barred: ReadonlySet<number>
}

export interface Pairing {
  proposal: number
  reviewer: number
  seat: Seat
}
