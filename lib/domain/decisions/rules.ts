import type { CallPhase } from '../calls/types'

export type Outcome = 'awarded' | 'reserve' | 'declined'

/** A state that is an outcome: the decision has been made known. */
export const isOutcome = (state: string): state is Outcome =>
  ['awarded', 'reserve', 'declined'].includes(state)

/** What given lines make of a proposal: any hour given is an award, hours in reserve alone are reserve, none is declined. */
export function outcomeOf(lines: readonly { seconds: number; isReserve: boolean }[]): Outcome {
  const some = lines.filter((line) => line.seconds > 0)
  if (some.some((line) => !line.isReserve)) return 'awarded'
  return some.length > 0 ? 'reserve' : 'declined'
}

export interface LineToGive {
  instrument: string
  telescopeId: number
  telescope: string
  seconds: number
  isReserve: boolean
  /** The most that may be given: what was asked, or what it truly takes. */
  most: number
  possible: boolean
}

const hours = (seconds: number) => `${(seconds / 3600).toFixed(1)} h`

/**
 * What is wrong with giving these lines, a sentence a line (by its place); empty when nothing is. `left` holds what
 * is free on each telescope before any of them.
 */
export function overAwards(
  lines: readonly LineToGive[],
  left: ReadonlyMap<number, number>,
): Map<number, string> {
  const free = new Map(left)
  const wrong = new Map<number, string>()
  for (const [index, line] of lines.entries()) {
    if (line.seconds === 0) continue
    if (!line.possible) {
      wrong.set(index, `${line.instrument} was assessed as not possible: no time can be given on it.`)
      continue
    }
    if (line.seconds > line.most) {
      wrong.set(index, `At most ${hours(line.most)} were asked of ${line.instrument}.`)
      continue
    }
    if (line.isReserve) continue
    const room = free.get(line.telescopeId) ?? 0
    if (line.seconds > room)
      wrong.set(index, `Only ${hours(Math.max(0, room))} are left on offer on ${line.telescope}.`)
    else free.set(line.telescopeId, room - line.seconds)
  }
  return wrong
}

export interface ReadyFacts {
  phase: CallPhase
  isFrozen: boolean
  undecided: number
  /** Proposals without a prepared decision, or with an empty statement. */
  unready: number
  /** Proposals whose decision no second person has approved as it stands. */
  unapproved: number
}

/** Why the decisions of a panel cannot be made known yet; null when they can. Counts are of what the asker may see. */
export function whyNotReleased({
  phase,
  isFrozen,
  undecided,
  unready,
  unapproved,
}: ReadyFacts): string | null {
  if (phase === 'decided' || phase === 'archived') return 'The decisions of this call are made known already.'
  if (phase !== 'ranking')
    return 'Decisions are made known once every panel of the call has begun its ranking.'
  if (undecided === 0) return 'The decisions of this panel are made known already.'
  if (!isFrozen) return 'Freeze the ranking first: decisions rest on it.'
  if (unready > 0) return 'Some decisions are not prepared yet: each needs an outcome and a statement.'
  return unapproved === 0
    ? null
    : 'Some decisions wait for a second person: whoever did not prepare them, chair, deputy or office, approves them.'
}
