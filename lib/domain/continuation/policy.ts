import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'
import { investigatorRow, lacksRight, mayLead, type ProposalSubject } from '../proposals/policy'

/** Whoever leads a proposal, or is its deputy, may carry its programme on in a later call. */
export function mayContinue(actor: Actor, subject: Pick<ProposalSubject, 'people'>): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office') ? no('role', 'The office does not write proposals.') : unseen('proposal')
  return mayLead(row)
    ? yes
    : lacksRight(row, 'The principal investigator or a deputy carries a proposal on in another call.')
}
