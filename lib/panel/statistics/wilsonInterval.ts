const z95 = 1.959963984540054

/** The 95 % interval of a chance seen `hits` times in `tries`: Wilson (1927, J. Am. Stat. Assoc. 22, 209). */
export function wilsonInterval(hits: number, tries: number): { low: number; high: number } {
  if (tries === 0) return { low: 0, high: 1 }
  const share = hits / tries
  const z2 = z95 * z95
  const middle = (share + z2 / (2 * tries)) / (1 + z2 / tries)
  const half = (z95 / (1 + z2 / tries)) * Math.sqrt((share * (1 - share)) / tries + z2 / (4 * tries * tries))
  return { low: Math.max(0, middle - half), high: Math.min(1, middle + half) }
}
