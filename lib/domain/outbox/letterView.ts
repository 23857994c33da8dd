import type { LetterRow } from './schema'

/** One letter as the office reads it, without what would open an account. */
export interface LetterView extends LetterRow {
  text: string
  messageId: string
  personId: number | null
  againOf: number | null
  /** Why it cannot be sent once more; null when it can. */
  whyNotAgain: string | null
}
