import type { Database } from '../client.ts'
import { retiredIds } from './retirements.ts'
import type { CallsRow } from '../tables.ts'

/** Locks a call's row until the transaction ends. */
export async function lockCall(db: Database, slug: string): Promise<CallsRow | null> {
  return (await db('calls').where({ slug }).forUpdate().first()) ?? null
}

export type CallChange = Partial<
  Pick<
    CallsRow,
    | 'stage'
    | 'opens_at'
    | 'closes_at'
    | 'grace_until'
    | 'assessments_due_at'
    | 'reviews_due_at'
    | 'panel_meets_at'
    | 'letters_at'
    | 'currency'
  >
>

/** Changes a call read at `version`; false when someone changed it in between. */
export async function updateCall(
  db: Database,
  id: number,
  version: number,
  change: CallChange,
): Promise<boolean> {
  const changed = await db('calls')
    .where({ id, version })
    .update({ ...change, version: version + 1 })
  return changed === 1
}

export async function insertCall(
  db: Database,
  call: Omit<CallsRow, 'id' | 'version' | 'created_at' | 'stage'>,
): Promise<number> {
  const [id] = await db('calls').insert({ ...call, stage: 'planned' })
  return id as number
}

/**
 * Kinds, criteria, panels with their members, and modes on offer, taken over from an earlier call; modes that retire
 * before the last evening of the new one are left out.
 */
export async function copyCallRules(
  db: Database,
  fromCallId: number,
  toCallId: number,
  seasonTo: string,
): Promise<void> {
  const panels = new Map<number, number>()
  for (const panel of await db('panels').where({ call_id: fromCallId })) {
    const [id] = await db('panels').insert({ call_id: toCallId, name: panel.name, quorum: panel.quorum })
    panels.set(panel.id, id as number)
    const members = await db('panel_members').where({ panel_id: panel.id }).whereNull('left_at')
    for (const { person_id, seat, number } of members)
      await db('panel_members').insert({ panel_id: id as number, person_id, seat, number })
  }
  for (const { id, call_id: _call, panel_id, closes_at: _closes, ...kind } of await db('call_kinds').where({
    call_id: fromCallId,
  })) {
    const [kindId] = await db('call_kinds').insert({
      ...kind,
      call_id: toCallId,
      panel_id: panels.get(panel_id) ?? panel_id,
    })
    for (const { id: _rate, ...rate } of await db('fee_rates').where({ call_kind_id: id }))
      await db('fee_rates').insert({ ...rate, call_kind_id: kindId as number })
  }
  for (const { id: _id, call_id: _call, ...criterion } of await db('call_criteria').where({
    call_id: fromCallId,
  }))
    await db('call_criteria').insert({ ...criterion, call_id: toCallId })
  for (const { mode_id } of await db('call_modes')
    .where({ call_id: fromCallId })
    .whereNotIn('mode_id', retiredIds(db, 'mode', seasonTo)))
    await db('call_modes').insert({ call_id: toCallId, mode_id })
  const grants = await db('role_grants').where({ call_id: fromCallId }).whereNull('revoked_at')
  for (const { id: _id, call_id: _call, created_at: _made, panel_id, ...grant } of grants)
    await db('role_grants').insert({
      ...grant,
      call_id: toCallId,
      panel_id: panel_id === null ? null : (panels.get(panel_id) ?? null),
    })
}
