import type { Database } from '../client.ts'
import type { InvitationsRow } from '../tables.ts'
import { utcIn, utcNow } from '../utcNow.ts'

export interface NewInvitation {
  tokenHash: string
  email: string
  name: string
  role: InvitationsRow['role']
  callId: number | null
  panelId: number | null
  instrumentId: number | null
  /** For an investigator named on a proposal. */
  proposalId?: number
  invitedBy: number
  lifeDays: number
  /** Until when the role will hold; without it, no end. */
  roleUntilAt?: Date | null
}

export async function insertInvitation(db: Database, invitation: NewInvitation): Promise<number> {
  const [id] = await db('invitations').insert({
    token_hash: invitation.tokenHash,
    email: invitation.email,
    name: invitation.name,
    role: invitation.role,
    call_id: invitation.callId,
    panel_id: invitation.panelId,
    instrument_id: invitation.instrumentId,
    proposal_id: invitation.proposalId ?? null,
    invited_by: invitation.invitedBy,
    role_until_at: invitation.roleUntilAt ?? null,
    expires_at: utcIn(db, 86_400 * invitation.lifeDays),
  })
  return id as number
}

export interface OpenInvitation extends InvitationsRow {
  call_number: number | null
  panel_name: string | null
  instrument_name: string | null
  proposal_reference: string | null
  proposal_title: string | null
  inviter: string | null
}

/** An invitation that can still be accepted; null when it is unknown, used, withdrawn or too old. */
export async function findOpenInvitation(db: Database, tokenHash: string): Promise<OpenInvitation | null> {
  const row = await db('invitations as i')
    .leftJoin('calls as c', 'c.id', 'i.call_id')
    .leftJoin('panels as p', 'p.id', 'i.panel_id')
    .leftJoin('instruments as n', 'n.id', 'i.instrument_id')
    .leftJoin('proposals as r', 'r.id', 'i.proposal_id')
    .leftJoin('people as b', 'b.id', 'i.invited_by')
    .where('i.token_hash', tokenHash)
    .whereNull('i.accepted_at')
    .whereNull('i.withdrawn_at')
    .andWhere('i.expires_at', '>', db.raw('UTC_TIMESTAMP(3)'))
    .first<OpenInvitation | undefined>(
      'i.*',
      'c.number as call_number',
      'p.name as panel_name',
      'n.name as instrument_name',
      'r.reference as proposal_reference',
      'r.title as proposal_title',
      'b.name as inviter',
    )
  return row ?? null
}

/** Takes an invitation; false when someone took it first. */
export async function takeInvitation(db: Database, id: number, personId: number): Promise<boolean> {
  const changed = await db('invitations')
    .where({ id })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ accepted_at: utcNow(db), accepted_by: personId })
  return changed === 1
}

export async function withdrawInvitation(db: Database, id: number): Promise<boolean> {
  const changed = await db('invitations')
    .where({ id })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ withdrawn_at: utcNow(db) })
  return changed === 1
}

/** Stops the links of someone who is named on a proposal no longer. */
export async function withdrawNaming(db: Database, proposalId: number, email: string): Promise<void> {
  await db('invitations')
    .where({ proposal_id: proposalId, email })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ withdrawn_at: utcNow(db) })
}

/** Ties the name on a proposal to the account that accepted its invitation. */
export async function tieInvestigator(
  db: Database,
  given: { proposalId: number; email: string; personId: number },
): Promise<void> {
  await db('proposal_people')
    .where({ proposal_id: given.proposalId, email: given.email })
    .update({ person_id: given.personId })
}

/** Whether the same role is offered to an address by an invitation that is still open. */
export async function isInvitedAlready(
  db: Database,
  wanted: Pick<NewInvitation, 'email' | 'role' | 'panelId' | 'instrumentId'>,
): Promise<boolean> {
  const row = await db('invitations')
    .where({
      email: wanted.email,
      role: wanted.role,
      panel_id: wanted.panelId,
      instrument_id: wanted.instrumentId,
      proposal_id: null,
    })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .andWhere('expires_at', '>', utcNow(db))
    .first('id')
  return row !== undefined
}
