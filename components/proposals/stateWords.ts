import type { ProposalState } from '@/lib/domain/proposals/types'

const words: Readonly<Record<ProposalState, string>> = {
  draft: 'draft',
  submitted: 'sent',
  'under-review': 'under review',
  awarded: 'awarded',
  reserve: 'reserve',
  declined: 'declined',
  withdrawn: 'withdrawn',
  lapsed: 'lapsed',
}

/** A proposal's state as it stands on screen. */
export function stateWords(proposal: {
  state: ProposalState
  isReopened: boolean
  isPutAway?: boolean
}): string {
  if (proposal.isPutAway) return 'put away'
  return proposal.isReopened ? 'sent, reopened' : words[proposal.state]
}
