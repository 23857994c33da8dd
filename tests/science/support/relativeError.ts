/** |value - expected| over |expected|; the absolute difference where nothing is expected. */
export function relativeError(value: number, expected: number): number {
  const difference = Math.abs(value - expected)
  return expected === 0 ? difference : difference / Math.abs(expected)
}
