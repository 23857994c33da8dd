import type { LetterRow } from '@/lib/domain/outbox/schema'

/** How a letter stands, in words. */
export const letterStands: Readonly<Record<LetterRow['state'], string>> = {
  queued: 'waiting',
  sending: 'being sent',
  sent: 'sent',
  parked: 'set aside',
  bounced: 'address refused',
  cancelled: 'stopped',
}
