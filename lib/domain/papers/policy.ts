import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'
import { investigatorRow, lacksRight, mayLead } from '../proposals/policy'
import type { ProposalContents } from '../proposals/types'

/** Who puts another file in the place of one that was sent, once the office has opened it. */
export function mayReplacePaper(actor: Actor, subject: Pick<ProposalContents, 'people' | 'state'>): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office')
      ? no('role', 'The office opens a paper; its investigators replace it.')
      : unseen('proposal')
  if (!mayLead(row)) return lacksRight(row, 'The principal investigator or a deputy replaces the paper.')
  return subject.state === 'submitted' || subject.state === 'under-review'
    ? yes
    : no('window', 'This proposal has been decided or has left the call.')
}
