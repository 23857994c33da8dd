/** A part of a night that another call offers. */
export interface NightElsewhere {
  /** Date of the evening. */
  eveningDate: string
  /** Fractions of the dark time. */
  from: number
  to: number
  callNumber: number
}
