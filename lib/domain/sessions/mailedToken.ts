import type { RandomSource } from '../context'
import { secretHash } from './secretHash'

/** A secret for a mailed link, and the hash that is stored in its place. */
export function mailedToken(random: RandomSource): { token: string; hash: string } {
  const token = Buffer.from(random.bytes(32)).toString('base64url')
  return { token, hash: secretHash(token) }
}
