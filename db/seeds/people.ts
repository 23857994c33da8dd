import { hashPassword } from '../../lib/domain/people/password.ts'
import { sortName } from '../../lib/domain/people/sortName.ts'
import type { Database } from '../client.ts'
import { demoPassword } from './accounts.ts'
import { institutes, investigators, panel, staff, type SeedPerson } from './peopleData.ts'

const long = new Date('2020-01-01T00:00:00Z')

/** Adds the institutes and people; all share one password, hashed once. Returns keys by name. */
export async function seedPeople(db: Database): Promise<Map<string, number>> {
  for (const institute of institutes) await db('institutes').insert(institute)
  const instituteIds = new Map((await db('institutes').select('id', 'name')).map((row) => [row.name, row.id]))
  const password_hash = await hashPassword(demoPassword)

  const ids = new Map<string, number>()
  const everyone: readonly SeedPerson[] = [...staff, ...panel, ...investigators]
  for (const person of everyone) {
    const [id] = await db('people').insert({
      email: person.email,
      name: person.name,
      sort_name: sortName(person.name),
      institute_id: instituteIds.get(person.institute) ?? null,
      institute_text: person.institute,
      career_stage: person.stage,
      password_hash,
      email_confirmed_at: long,
      is_demo: 1,
    })
    ids.set(person.name, id as number)
    await db('role_grants').insert({ person_id: id as number, role: 'investigator', from_at: long })
  }
  return ids
}
