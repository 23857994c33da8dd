import { z } from 'zod'
import { observationsOf } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { groupsOf } from '@/db/queries/targetGroups'
import { freeNames } from '@/db/queries/targetNames'
import { deleteTarget, insertTarget, targetsOf, updateTarget } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { changedFields } from '../proposals/changedFields'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { Target } from '../proposals/types'
import { keptValues } from './keptValues'
import { targetRowSchema } from './schema'
import { targetRow } from './targetRow'
import { mostTargets } from './limits'
import { nameKey, nextPosition, requireRoom } from './targetRules'

const id = z.number().int().positive()

export const changeTargetsSchema = z.object({
  reference: z.string().max(10),
  changed: z.array(z.object({ id, version: id, row: targetRowSchema })).max(mostTargets),
  added: z.array(targetRowSchema).max(mostTargets),
  /** Taken out again: rows just added, which nothing observes yet. */
  removed: z.array(z.object({ id, version: id })).max(mostTargets),
})

export type ChangeTargetsInput = z.output<typeof changeTargetsSchema>

export interface ChangedTargets {
  changed: Target[]
  added: Target[]
}

/** Each of these rows as it stands, found and unchanged since it was read. */
async function asRead(
  tx: Context,
  proposal: { reference: string; updated_at: Date },
  present: readonly Target[],
  wanted: readonly { id: number; version: number }[],
): Promise<Target[]> {
  const byId = new Map(present.map((target) => [target.id, target]))
  return Promise.all(
    wanted.map(async ({ id: key, version }) => {
      const target = byId.get(key)
      if (!target) throw refuse.notFound('target')
      if (target.version === version) return target
      const { reference, updated_at } = proposal
      throw await staleProposal(tx, { reference, updated_at, version: target.version }, targetRow(target))
    }),
  )
}

/** Refuses names that would stand twice, each at its row. */
function requireNames(names: readonly { at: string; name: string }[]): void {
  const seen = new Set<string>()
  const clashes: Record<string, string> = {}
  for (const { at, name } of names) {
    if (seen.has(nameKey(name))) clashes[at] = 'Another target is called that already.'
    seen.add(nameKey(name))
  }
  if (Object.keys(clashes).length > 0) throw refuse.invalid('Some names would stand twice.', clashes)
}

/**
 * Changes many rows at once, as a block is pasted or a change is taken back: all of it or nothing. Who comes second is
 * refused, as for one row.
 */
export async function changeTargets(ctx: Context, input: ChangeTargetsInput): Promise<ChangedTargets> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForEditing(tx, input.reference)
    const present = await targetsOf(tx.db, row.id)
    const before = await asRead(tx, row, present, input.changed)
    const gone = await asRead(tx, row, present, input.removed)
    const observed = new Set((await observationsOf(tx.db, row.id)).map(({ targetId }) => targetId))
    const inUse = gone.find((target) => observed.has(target.id))
    if (inUse) throw refuse.invalid(`${inUse.name} is observed already: take it out at its row.`)
    requireRoom(present.length - gone.length, input.added.length)
    const touched = new Set([...before, ...gone].map((target) => target.id))
    requireNames([
      ...present.filter((target) => !touched.has(target.id)).map(({ name }) => ({ at: '', name })),
      ...input.changed.map((one, index) => ({ at: `changed.${index}.row.name`, name: one.row.name })),
      ...input.added.map(({ name }, index) => ({ at: `added.${index}.name`, name })),
    ])

    const standing = { kind: subject.kind, groups: await groupsOf(tx.db, row.id) }
    for (const target of gone) await deleteTarget(tx.db, target.id)
    const renamed = before.filter(({ name }, index) => input.changed[index]?.row.name !== name)
    await freeNames(
      tx.db,
      renamed.map((target) => target.id),
    )
    for (const [index, target] of before.entries()) {
      const given = input.changed[index]?.row ?? target
      const values = keptValues(given, standing, `changed.${index}.row`)
      await updateTarget(tx.db, row.id, target, { ...values, position: target.position })
    }
    const first = nextPosition(present)
    const ids: number[] = []
    for (const [index, given] of input.added.entries()) {
      const values = keptValues(given, standing, `added.${index}`)
      ids.push(await insertTarget(tx.db, row.id, { ...values, position: first + index }))
    }
    const after = new Map((await targetsOf(tx.db, row.id)).map((target) => [target.id, target]))
    const here = (key: number) => {
      const target = after.get(key)
      if (!target) throw refuse.integrity('A target could not be read back.')
      return target
    }
    const result = { changed: before.map((target) => here(target.id)), added: ids.map(here) }
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.change',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { targets: before.map((target) => difference(target, here(target.id)).before), removed: gone },
      after: {
        targets: before.map((target) => difference(target, here(target.id)).after),
        added: result.added.map(({ name }) => name),
      },
    })
    return result
  })
}

function difference(was: Target, is: Target) {
  const changed = changedFields<Record<string, unknown>>({ ...was, version: 0 }, { ...is, version: 0 })
  return { before: { id: was.id, ...changed?.before }, after: { id: is.id, ...changed?.after } }
}
