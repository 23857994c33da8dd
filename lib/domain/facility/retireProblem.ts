import { formatCalendarDate } from '@/lib/format'
import { offeredWords } from './offeredWords'

interface Offer {
  number: number
  seasonTo: string
  isOpen: boolean
  modes: readonly string[]
}

/**
 * Why something may not retire on an evening; null when it may. Calls that have closed keep what they offered: only
 * those that can still change their offer stand in the way. Dates as `YYYY-MM-DD`.
 */
export function retireProblem(retiredFrom: string, today: string, offers: readonly Offer[]): string | null {
  if (retiredFrom < today) return 'Something retires today or later.'
  const offer = offers.find(({ isOpen, seasonTo }) => isOpen && seasonTo >= retiredFrom)
  if (!offer) return null
  return (
    `Call ${offer.number} offers ${offeredWords(offer.modes)} to ${formatCalendarDate(offer.seasonTo)}: ` +
    'take that off its offer first, or choose a later evening.'
  )
}
