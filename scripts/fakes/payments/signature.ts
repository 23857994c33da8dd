import { createHmac } from 'node:crypto'

/** The header of a signed webhook: a time and the HMAC-SHA256 of `time.payload`, scheme v1. */
export function signatureHeader(payload: string, secret: string, unixTime: number): string {
  const digest = createHmac('sha256', secret).update(`${unixTime}.${payload}`).digest('hex')
  return `t=${unixTime},v1=${digest}`
}
