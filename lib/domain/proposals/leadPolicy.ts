import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'
import { investigatorRow, type ProposalSubject } from './policy'
import type { Investigator } from './types'

type Subject = Pick<ProposalSubject, 'people' | 'state'>

const over: readonly Subject['state'][] = ['declined', 'withdrawn', 'lapsed']

/** Who leads matters as long as somebody may still be asked about the proposal or use its time. */
const stillLed = ({ state }: Subject): Decision =>
  over.includes(state) ? no('window', 'This proposal is over: nobody needs to lead it any more.') : yes

/** Only the principal investigator asks somebody else to lead; a deputy does not give away what is not theirs. */
export function mayOfferLead(actor: Actor, subject: Subject): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office')
      ? no('role', 'The office does not say who leads a proposal.')
      : unseen('proposal')
  if (row.role !== 'pi') return no('role', 'The principal investigator says who is to lead instead.')
  return stillLed(subject)
}

/** Whoever was asked, and nobody else, says yes or no. */
export function mayAnswerLeadOffer(actor: Actor, subject: Subject, offeredTo: number | null): Decision {
  const row = investigatorRow(actor, subject)
  if (!row) return unseen('proposal')
  if (offeredTo !== actor.personId) return no('role', 'You have not been asked to lead this proposal.')
  return stillLed(subject)
}

/** Why this person cannot be asked to lead, in a sentence; null when they can. */
export function cannotLead(person: Investigator): string | null {
  if (person.role === 'pi') return `${person.name} leads the proposal already.`
  if (!person.confirmedAt || person.personId === null)
    return `${person.name} has yet to agree to be named. Only then can they lead.`
  return null
}
