/** Least award that is still of use where the investigators named none: half of what was asked, to the minute above. */
export function leastUseful(askedSeconds: number): number {
  return Math.min(askedSeconds, Math.ceil(askedSeconds / 2 / 60) * 60)
}
