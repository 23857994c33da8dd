import type { Database } from '../../client.ts'

const long = new Date('2020-01-01T00:00:00Z')

/** Who sits on the two panels of the earlier call: chair and deputy first. Nobody sits on both. */
export const seatsOfTwo = {
  regular: ['Edda Vorskell', 'Corin Thessaly', 'Mirela Fontane', 'Ines Caldwyn', 'Rasmus Ekholt'],
  large: ['Tobin Aldersey', 'Priya Valmont', 'Hedda Brandvik', 'Yuna Parrish', 'Leander Moss'],
} as const

/** Seats a panel, and gives the roles that go with the seats. */
export async function seatPanel(
  db: Database,
  people: ReadonlyMap<string, number>,
  key: { callId: number; panelId: number },
  names: readonly string[],
): Promise<void> {
  for (const [index, name] of names.entries()) {
    const person_id = people.get(name)
    if (person_id === undefined) throw new Error(`nobody is called ${name}`)
    const seat = index === 0 ? 'chair' : index === 1 ? 'deputy' : 'member'
    await db('panel_members').insert({ panel_id: key.panelId, person_id, seat, number: index + 1 })
    const grant = { person_id, call_id: key.callId, panel_id: key.panelId, from_at: long }
    await db('role_grants').insert({ ...grant, role: 'reviewer' })
    if (seat !== 'member') await db('role_grants').insert({ ...grant, role: 'chair' })
  }
}
