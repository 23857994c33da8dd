import { formatList } from '@/lib/format'
import type { ProposalContents } from '../proposals/types'
import { instrumentsUsed } from './rules'

export interface DateAhead {
  id: string
  at: Date
  /** Only the day matters. */
  dayOnly: boolean
  words: string
}

/** What happens to a sent proposal and when: for the confirmation and for calendars. */
export function weeksAhead(contents: ProposalContents, deadline: Date, to: { email: string }): DateAhead[] {
  const { call } = contents
  const used = new Set(instrumentsUsed(contents))
  const names = [...new Map(contents.modes.map(({ instrument }) => [instrument.id, instrument.name]))]
    .filter(([id]) => used.has(id))
    .map(([, name]) => name)
  const scientist =
    names.length === 1
      ? `${names[0] ?? ''}’s instrument scientist has assessed the hours, and may have asked you something.`
      : `The instrument scientists of ${formatList(names)} have assessed the hours, and may have asked you something.`
  return [
    {
      id: 'closes',
      at: deadline,
      dayOnly: false,
      words: 'The call closes. Until then you may reopen this proposal or withdraw it.',
    },
    { id: 'assessed', at: call.assessmentsDueAt, dayOnly: false, words: scientist },
    {
      id: 'reviewed',
      at: call.reviewsDueAt,
      dayOnly: false,
      words: 'Reviews are in. Reviewers see no names.',
    },
    {
      id: 'panel',
      at: call.panelMeetsAt,
      dayOnly: true,
      words: 'The panel draws the line and divides the nights.',
    },
    {
      id: 'letters',
      at: call.lettersAt,
      dayOnly: true,
      words: `A letter with the decision and the panel’s comments comes to ${to.email}.`,
    },
  ]
}
