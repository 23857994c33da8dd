import type { Database } from '../client.ts'
import type { SeededCall } from './calls.ts'
import { panel } from './peopleData.ts'

const long = new Date('2020-01-01T00:00:00Z')

/** Office, instrument scientists, and one panel that sits for all three calls. */
export async function seedRoles(
  db: Database,
  people: Map<string, number>,
  instrumentIds: Map<string, number>,
  calls: readonly SeededCall[],
): Promise<void> {
  const idOf = (name: string) => {
    const id = people.get(name)
    if (id === undefined) throw new Error(`nobody is called ${name}`)
    return id
  }
  await db('role_grants').insert({ person_id: idOf('Maud Ferrisay'), role: 'office', from_at: long })
  const scientists = [
    ['Signe Oskeldane', ['ember', 'spindle']],
    ['Piers Haldrick', ['lantern']],
    ['Noor Velasquine', ['wick']],
  ] as const
  for (const [name, slugs] of scientists)
    for (const slug of slugs)
      await db('role_grants').insert({
        person_id: idOf(name),
        role: 'instrument-scientist',
        instrument_id: instrumentIds.get(slug) ?? null,
        from_at: long,
      })

  for (const call of calls)
    for (const [index, { name }] of panel.entries()) {
      const seat = index === 0 ? 'chair' : index === 3 ? 'deputy' : 'member'
      const person_id = idOf(name)
      await db('panel_members').insert({ panel_id: call.panelId, person_id, seat, number: index + 1 })
      const grant = { person_id, call_id: call.id, panel_id: call.panelId, from_at: long }
      await db('role_grants').insert({ ...grant, role: 'reviewer' })
      if (seat !== 'member') await db('role_grants').insert({ ...grant, role: 'chair' })
    }
}
