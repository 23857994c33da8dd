import { Refusal, refuse } from '../errors'

const databaseDown = new Set(['ECONNREFUSED', 'ECONNRESET', 'ETIMEDOUT', 'PROTOCOL_CONNECTION_LOST', 'EPIPE'])

/** A refusal as it is; a database that does not answer as 'unavailable'; null for anything unexpected. */
export function asRefusal(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error
  if (!(error instanceof Error)) return null
  const code = 'code' in error && typeof error.code === 'string' ? error.code : ''
  if (databaseDown.has(code) || error.name === 'KnexTimeoutError')
    return refuse.unavailable('database', error)
  return null
}
