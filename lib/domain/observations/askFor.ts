/** The hours to ask for what is needed: rounded up to the next tenth, as text for the field. */
export function askFor(neededSeconds: number): string {
  return (Math.ceil(neededSeconds / 360 - 1e-9) / 10).toFixed(1)
}
