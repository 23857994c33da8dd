import { createHash, timingSafeEqual } from 'node:crypto'
import { env } from '@/lib/env'

const digest = (text: string) => createHash('sha256').update(text).digest()

/** Whether this is the secret of the mail server's pipe, compared in constant time; never where none is set. */
export function isReportSecret(given: string): boolean {
  const secret = env().MAIL_REPORT_SECRET
  return secret !== undefined && timingSafeEqual(digest(given), digest(secret))
}
