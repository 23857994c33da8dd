/** Why a version may not begin on an evening; null when it may. Dates as `YYYY-MM-DD`. */
export function eveningProblem(validFrom: string, today: string, wasUsed: boolean): string | null {
  if (validFrom >= today || !wasUsed) return null
  return 'It has been computed with already: a new version begins today or later.'
}
