import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'
import { investigatorRow, lacksRight, mayLead } from '../proposals/policy'
import type { ProposalContents } from '../proposals/types'

type Subject = Pick<ProposalContents, 'people'>

/** Any of the investigators may pay, whoever sent it. */
export function mayPayFee(actor: Actor, subject: Subject): Decision {
  if (investigatorRow(actor, subject)) return yes
  return holds(actor, 'office') ? no('role', 'The office does not pay fees.') : unseen('proposal')
}

/** Those who lead the proposal may ask for its fee to be waived. */
export function mayAskForWaiver(actor: Actor, subject: Subject): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office')
      ? no('role', 'The office decides waivers; it asks for none.')
      : unseen('proposal')
  return mayLead(row) ? yes : lacksRight(row, 'The principal investigator or a deputy asks for a waiver.')
}

export function mayDecideWaiver(actor: Actor): Decision {
  return holds(actor, 'office') ? yes : unseen('request')
}

/** The books of fees: refunds, invoices, the ledger and what the payment firm says. */
export function mayHandleFees(actor: Actor): Decision {
  return holds(actor, 'office') ? yes : unseen('fee')
}

/** Those who lead the proposal ask for an invoice to their institute, and the office may for them. */
export function mayAskForInvoice(actor: Actor, subject: Subject): Decision {
  if (holds(actor, 'office')) return yes
  const row = investigatorRow(actor, subject)
  if (!row) return unseen('proposal')
  return row.role === 'pi' || row.access === 'deputy'
    ? yes
    : no('role', 'The principal investigator or a deputy asks for an invoice.')
}
