import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { formatUtcInstant } from '@/lib/format'
import { holds, type Actor } from '../actor'
import { deadlineOf, takesProposals } from '../calls/rules'
import type { Investigator, ProposalContents } from './types'

/** What a policy must know of a proposal; whole contents will do. */
export type ProposalSubject = Pick<
  ProposalContents,
  'state' | 'isReopened' | 'closesAt' | 'call' | 'kind' | 'people'
>

/** The row of the proposal that names this person; null for a stranger. */
export function investigatorRow(actor: Actor, subject: Pick<ProposalSubject, 'people'>): Investigator | null {
  return subject.people.find((person) => person.personId === actor.personId) ?? null
}

/** Whether someone named may change the text, and whether they may send it and speak for it: once they agreed. */
const mayAct = (row: Investigator) => row.confirmedAt !== null && (row.role === 'pi' || row.access !== 'read')
export const mayLead = (row: Investigator) =>
  row.confirmedAt !== null && (row.role === 'pi' || row.access === 'deputy')

/** The no for someone named whose right is too small, or who has the right and has yet to agree. */
export const lacksRight = (row: Investigator, sentence: string): Decision =>
  no(
    'role',
    row.confirmedAt === null && row.access !== 'read' ? 'Agree to be named first, under People.' : sentence,
  )

/** Investigators and the office. To anyone else the proposal does not exist. */
export function mayReadProposal(actor: Actor, subject: Pick<ProposalSubject, 'people'>): Decision {
  return investigatorRow(actor, subject) || holds(actor, 'office') ? yes : unseen('proposal')
}

/** Being written: a draft, or a sent proposal that was reopened. */
export const isOpenForWriting = (subject: Pick<ProposalSubject, 'state' | 'isReopened'>): boolean =>
  subject.state === 'draft' || subject.isReopened

function inTime(subject: ProposalSubject, at: Date): Decision {
  if (subject.state === 'withdrawn') return no('window', 'This proposal has been put away.')
  if (!isOpenForWriting(subject))
    return no(
      'window',
      'This proposal has been sent. Reopen it to change it; the sent version stands meanwhile.',
    )
  const deadline = deadlineOf(subject.call, subject.kind, subject)
  if (takesProposals(subject.call, deadline, at)) return yes
  if (at < subject.call.opensAt || subject.call.stage === 'planned')
    return no('window', 'The call has not opened yet.')
  return no('window', `The call closed at ${formatUtcInstant(deadline)}. Nothing can be changed any more.`)
}

/** Writers, while it is a draft or reopened, before the deadline by the database's clock. */
export function mayEditProposal(actor: Actor, subject: ProposalSubject, now: Date): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office')
      ? no('role', 'The office reads proposals; it does not change them.')
      : unseen('proposal')
  if (!mayAct(row))
    return lacksRight(
      row,
      'You may read this proposal. Ask its principal investigator for the right to change it.',
    )
  return inTime(subject, now)
}

/** The principal investigator and deputies; judged by the stamp of arrival, not by the time of writing. */
export function maySendProposal(actor: Actor, subject: ProposalSubject, arrivedAt: Date): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office') ? no('role', 'The office does not send proposals.') : unseen('proposal')
  if (!mayLead(row)) return lacksRight(row, 'The principal investigator or a deputy sends the proposal.')
  return inTime(subject, arrivedAt)
}

/** Who is named, and what they may do: the principal investigator and deputies. */
export function mayManagePeople(actor: Actor, subject: ProposalSubject, now: Date): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office')
      ? no('role', 'The office reads proposals; it does not change them.')
      : unseen('proposal')
  if (!mayLead(row)) return lacksRight(row, 'The principal investigator or a deputy says who is named.')
  return inTime(subject, now)
}

/** A draft that was never sent, by the principal investigator or a deputy; the deadline does not matter. */
export function mayPutAway(actor: Actor, subject: Pick<ProposalSubject, 'people' | 'state'>): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office') ? no('role', 'The office does not put drafts away.') : unseen('proposal')
  if (!mayLead(row)) return lacksRight(row, 'The principal investigator or a deputy puts a draft away.')
  return subject.state === 'draft'
    ? yes
    : no('window', 'Only a draft can be put away. A sent proposal is withdrawn.')
}

/** A co-investigator, while names can still change. The principal investigator cannot leave. */
export function mayLeave(actor: Actor, subject: ProposalSubject): Decision {
  const row = investigatorRow(actor, subject)
  if (!row) return unseen('proposal')
  if (row.role === 'pi')
    return no(
      'role',
      'The principal investigator cannot leave. Ask someone to lead it first, or put the draft away.',
    )
  return isOpenForWriting(subject)
    ? yes
    : no('window', 'The proposal has been sent with your name. Write to the office to take it off.')
}

/** The person named, once, whatever the hour: agreeing changes nobody's text. */
export function mayConfirm(actor: Actor, subject: ProposalSubject): Decision {
  if (!investigatorRow(actor, subject)) return unseen('proposal')
  return subject.state === 'withdrawn' ? no('window', 'This proposal has been put away.') : yes
}
