import type { LetterRow } from './schema'

const once = new Set(['reset-password', 'confirm-address'])

/** A letter to somebody who was erased: its reader and its words are blotted out once it has gone, or cannot go. */
export const isForgottenOnceSent = (template: string): boolean => template === 'person-erased'

/** Why a letter cannot be sent once more; null when it can. */
export function whyNotAgain(letter: Pick<LetterRow, 'state' | 'template'>): string | null {
  if (letter.state !== 'sent') return 'Only a letter that was sent can be sent again.'
  if (isForgottenOnceSent(letter.template))
    return 'Its reader was erased, and so was the address: there is nobody to write to.'
  if (once.has(letter.template))
    return 'Its link works once and for a short time. Its owner asks for a new one under “Sign in”.'
  return null
}

/** A letter that was not taken yet, or not at all, and may be tried now. */
export const mayBeTriedNow = (letter: Pick<LetterRow, 'state'>): boolean =>
  letter.state === 'queued' || letter.state === 'parked' || letter.state === 'bounced'
