import type { SubjectEntry } from '@/db/queries/logbook'
import type { BegunPaymentRow, FeeLetter, PaymentNoticeRow } from '@/db/queries/feeEvents'
import { letterEvent } from './letterEvent'
import { loggedEvent } from './loggedEvent'
import { noticeEvent } from './noticeEvent'

export interface FeeEvent {
  at: Date
  words: string
  /** Who did it; null for the clock and the payment firm. */
  who: string | null
  tone: 'plain' | 'settled' | 'refused' | 'deadline'
}

export interface FeeHistory {
  entries: readonly SubjectEntry[]
  attempts: readonly BegunPaymentRow[]
  notices: readonly PaymentNoticeRow[]
  letters: readonly FeeLetter[]
  currency: string
  /** Moments of the call that matter to a fee. */
  moments: readonly { at: Date; words: string }[]
  now: Date
}

/**
 * Everything that happened to a fee, the oldest first; of one moment, what was begun before what came of it: what the
 * logbook, the firm, the post and the clock know.
 */
export function feeEvents(history: FeeHistory): FeeEvent[] {
  const events: (FeeEvent | null)[] = [
    ...history.attempts.map(({ at, by }, index) => ({
      at,
      words: index === 0 ? 'Payment started on the firm’s page' : 'Payment started again',
      who: by,
      tone: 'plain' as const,
    })),
    ...history.entries.map((entry) => loggedEvent(entry, history.currency)),
    ...history.notices.map(noticeEvent),
    ...history.letters.map(letterEvent),
    ...history.moments
      .filter(({ at }) => at <= history.now)
      .map(({ at, words }) => ({ at, words, who: null, tone: 'deadline' as const })),
  ]
  return events.filter((event) => event !== null).sort((a, b) => a.at.getTime() - b.at.getTime())
}
