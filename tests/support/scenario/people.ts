import type { Database } from '@/db/client'
import type { Actor, Role, RoleGrant } from '@/lib/domain/actor'
import type { ScenarioCall } from './call'
import type { ScenarioFacility } from './facility'

type Scope = Partial<Omit<RoleGrant, 'role'>>

/** An account with one role (every investigator is one besides), ready to act. */
export async function makePerson(
  db: Database,
  tag: string,
  name: string,
  role: Role = 'investigator',
  scope: Scope = {},
): Promise<Actor> {
  const slug = name.toLowerCase().replace(/[^a-z]+/g, '.')
  const email = `${slug}.${tag}@tarnhead.example`
  const [personId = 0] = await db('people').insert({
    email,
    name,
    sort_name: name.split(' ').reverse().join(', '),
    institute_text: `${name.split(' ').at(-1) ?? ''} Institute`,
    career_stage: 'staff',
    email_confirmed_at: new Date(),
  })
  const grants: RoleGrant[] = [{ role, callId: null, panelId: null, instrumentId: null, ...scope }]
  await db('role_grants').insert(
    grants.map((grant) => ({
      person_id: personId,
      role: grant.role,
      call_id: grant.callId,
      panel_id: grant.panelId,
      instrument_id: grant.instrumentId,
      from_at: new Date(Date.now() - 3600_000),
    })),
  )
  return { personId, name, email, timeZone: 'UTC', grants }
}

export interface ScenarioPeople {
  pi: Actor
  coInvestigator: Actor
  /** Investigator of nothing here. */
  stranger: Actor
  reviewers: [Actor, Actor, Actor]
  chair: Actor
  scientist: Actor
  office: Actor
}

/** One person for each part that is played in a call; the panel's seats are taken. */
export async function makePeople(
  db: Database,
  tag: string,
  facility: ScenarioFacility,
  call: ScenarioCall,
): Promise<ScenarioPeople> {
  const onPanel = { callId: call.callId, panelId: call.panelId }
  const people: ScenarioPeople = {
    pi: await makePerson(db, tag, 'Maren Sollvik'),
    coInvestigator: await makePerson(db, tag, 'Odo Pellering'),
    stranger: await makePerson(db, tag, 'Ruta Winterhalt'),
    reviewers: [
      await makePerson(db, tag, 'Ansa Brightmoor', 'reviewer', onPanel),
      await makePerson(db, tag, 'Cai Dunmarrow', 'reviewer', onPanel),
      await makePerson(db, tag, 'Edda Farrowby', 'reviewer', onPanel),
    ],
    chair: await makePerson(db, tag, 'Gwil Harrowgate', 'chair', onPanel),
    scientist: await makePerson(db, tag, 'Ines Jorrold', 'instrument-scientist', {
      instrumentId: facility.instrumentId,
    }),
    office: await makePerson(db, tag, 'Kit Larkmoor', 'office'),
  }
  const seats = [people.chair, ...people.reviewers]
  await db('panel_members').insert(
    seats.map((person, index) => ({
      panel_id: call.panelId,
      person_id: person.personId,
      seat: index === 0 ? ('chair' as const) : ('member' as const),
      number: index + 1,
    })),
  )
  return people
}
