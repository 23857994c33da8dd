const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

function parsed(json: string): unknown {
  try {
    return JSON.parse(json) as unknown
  } catch {
    return json
  }
}

function wordsOf(value: unknown): string {
  if (value === null || value === undefined || value === '') return 'none'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(wordsOf).join(', ')
  if (isRecord(value))
    return Object.entries(value)
      .map(([name, inner]) => `${name} ${isRecord(inner) ? `(${wordsOf(inner)})` : wordsOf(inner)}`)
      .join('; ')
  return typeof value === 'string' ? value : JSON.stringify(value)
}

/** What the logbook holds as JSON, as `state submitted; isReopened no`; nothing stays nothing. */
export const loggedWords = (json: string): string => (json === '' ? '' : wordsOf(parsed(json)))
