import type { BinnedLine, BinnedPart, NightBin } from '@/lib/panel/nights/binTypes'

const h = 3600

/** A dark piece of the season on telescope 1. */
export const bin = (hours: number, half = 0): NightBin => ({
  telescope: 1,
  half,
  siderealFromH: 0,
  moon: 'dark',
  seconds: hours * h,
})

/** A part of a request, with the hours it can use of each bin by its place. */
export const part = (hours: number, usable: Record<number, number>): BinnedPart => ({
  seconds: hours * h,
  usable: new Map(Object.entries(usable).map(([at, can]) => [Number(at), can * h])),
})

/** A request on one instrument, of which half is the least useful. */
export function line(proposal: number, parts: BinnedPart[], more: Partial<BinnedLine> = {}): BinnedLine {
  const seconds = parts.reduce((sum, one) => sum + one.seconds, 0)
  return {
    ...{ proposal, instrument: 10, telescope: 1, seconds, least: seconds / 2, possible: true, parts },
    ...more,
  }
}
