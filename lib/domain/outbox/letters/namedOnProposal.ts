import { formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

export interface NamedOnProposal {
  toName: string
  byName: string
  title: string
  reference: string
  callTitle: string
  deadline: Date
  mayEdit: boolean
  hasAccount: boolean
  url: string
}

/** To someone named on a proposal: what it is, who names them, and where to agree or to leave. */
export function namedOnProposal(given: NamedOnProposal): Letter {
  return {
    template: 'named-on-proposal',
    subject: `${given.byName} names you on a proposal`,
    greeting: `Dear ${given.toName},`,
    paragraphs: [
      `${given.byName} is writing a proposal for telescope time and names you as a co-investigator. Open the link to agree, or to take your name off again.`,
      given.mayEdit
        ? 'You may read the proposal, and change it once you have agreed, until it is sent.'
        : 'You may read the proposal at any time.',
      given.hasAccount
        ? 'Sign in with this address.'
        : 'You have no account with this address yet: the link opens one, and holds for 60 days. It takes a minute.',
    ],
    facts: [
      ['Proposal', given.title || 'without a title yet'],
      ['Reference', given.reference],
      ['Call', given.callTitle],
      ['Deadline', formatUtcWithYear(given.deadline)],
    ],
    action: { label: 'Read the proposal and answer', url: given.url },
    closing:
      'If you do not know what this is about, do nothing: the proposal is sent without your name unless you agree.',
  }
}
