const day = 86_400_000

/** The evening some days after one. */
export const eveningAfter = (date: string, days: number): string =>
  new Date(Date.parse(date) + days * day).toISOString().slice(0, 10)

/** Evenings from one to another, both included. */
export function eveningsBetween(from: string, to: string): string[] {
  const count = Math.round((Date.parse(to) - Date.parse(from)) / day) + 1
  return Array.from({ length: Math.max(0, count) }, (_, index) => eveningAfter(from, index))
}
