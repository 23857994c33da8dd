import { createHash } from 'node:crypto'

/** Only the hash of a session id or of a mailed token is stored: a stolen table opens nothing. */
export function secretHash(secret: string): string {
  return createHash('sha256').update(secret).digest('hex')
}
