import { countInWords, formatNumber, NO_BREAK_SPACE } from '@/lib/format'
import type { Target } from '../proposals/types'

/** What a target of opportunity waits for, in sentences; null for a target that is there already. */
export function awaitedWords(target: Pick<Target, 'opportunity' | 'raDeg'>): string | null {
  const { opportunity, raDeg } = target
  if (!opportunity) return null
  const { event, trigger, reactionSeconds, triggers } = opportunity
  const hours = `${formatNumber(reactionSeconds / 3600, reactionSeconds % 3600 === 0 ? 0 : 1)}${NO_BREAK_SPACE}h`
  const asked = `${countInWords(triggers, 'trigger', 'triggers', true)} asked for, each observed within ${hours}.`
  const noPosition =
    raDeg === null
      ? ' No position yet: when it is up cannot be judged, and its exposure is computed at the largest airmass accepted.'
      : ''
  return `${event}, once this is seen: ${trigger.replace(/\.$/, '')}. ${asked}${noPosition}`
}
