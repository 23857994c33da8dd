import { formatList } from '@/lib/format'
import type { CallPhase } from '../calls/types'

/** What holds where nobody has laid down another rule. */
export const usualRule = 'hours'

/** Why the rule by which time is shared can no longer be changed; null while it can. */
export function whyRuleIsFixed(phase: CallPhase, panels: number, frozenPanel: string | null): string | null {
  if (panels < 2) return 'This call has one panel: nothing is to be shared.'
  if (frozenPanel !== null)
    return `The rule was fixed when ${frozenPanel} froze its ranking: it may not follow from ranks that are known.`
  return phase === 'decided' || phase === 'archived' ? 'The decisions of this call are made known.' : null
}

export interface PanelState {
  name: string
  /** Proposals it judges. */
  proposals: number
  /** Where its list stands. */
  list: 'none' | 'open' | 'frozen'
}

/** Why the lists of a call cannot be brought together; null when they can. */
export function whyNotTogether(phase: CallPhase, panels: readonly PanelState[]): string | null {
  if (panels.length < 2) return 'This call has one panel: its own list is the order.'
  if (phase === 'decided' || phase === 'archived')
    return 'The decisions of this call are made known: the order stands.'
  const judging = panels.filter(({ proposals }) => proposals > 0)
  if (judging.length === 0) return 'No panel of this call has a proposal.'
  if (judging.length === 1) return `Only ${judging[0]?.name ?? ''} has proposals: its own list is the order.`
  const open = judging.filter(({ list }) => list !== 'frozen').map(({ name }) => name)
  if (open.length === 0) return null
  return `${formatList(open)} ${open.length === 1 ? 'has' : 'have'} no frozen ranking yet: lists are brought together once every panel has frozen its own.`
}

export interface PlacedProposal {
  id: number
  panelId: number
  reviewNumber: string
  isNear: boolean
}

/**
 * Why a proposal cannot take a place, among those its mover sees; null when it can. The order within a panel stands:
 * it is changed in that panel's own ranking.
 */
export function whyNotMoved(shown: readonly PlacedProposal[], from: number, place: number): string | null {
  const moved = shown[from - 1]
  const target = shown[place - 1]
  if (!moved) return 'This proposal is not in the list.'
  if (!target) return `The last place is ${shown.length}.`
  if (from === place) return `It stands at place ${from} already.`
  if (!moved.isNear) return `${moved.reviewNumber} does not stand near a line: its panel’s share decides.`
  if (!target.isNear) {
    const near = shown.flatMap(({ isNear }, index) => (isNear ? [index + 1] : []))
    return `Near the lines are places ${near[0]} to ${near.at(-1)}.`
  }
  const passed = place < from ? shown.slice(place - 1, from - 1) : shown.slice(from, place)
  const own = passed.find(({ panelId }) => panelId === moved.panelId)
  return own
    ? `${own.reviewNumber} is of the same panel, whose own order stands. Change it in the panel’s ranking.`
    : null
}
