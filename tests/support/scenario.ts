import { randomBytes } from 'node:crypto'
import type { Database } from '@/db/client'
import { referenceFrom } from '@/lib/domain/proposals/reference'
import type { ObjectStore } from '@/lib/services/storage/ObjectStore'
import { makeCall, type ScenarioCall, type ScenarioCallOptions } from './scenario/call'
import { makeDraft, type ScenarioDraft } from './scenario/draft'
import { makeFacility, type ScenarioFacility } from './scenario/facility'
import { makePeople, type ScenarioPeople } from './scenario/people'

export interface ScenarioOptions extends ScenarioCallOptions {
  /** Where the paper's bytes are put; without it only its row is made. */
  storage?: ObjectStore
}

/** One site, telescope, instrument and mode; an open call; a person for each part; a draft ready to be sent. */
export interface Scenario extends ScenarioFacility, ScenarioCall, ScenarioPeople, ScenarioDraft {
  tag: string
}

/** Builds the scenario in `db`: a transaction that is rolled back, or a database of the test's own. */
export async function makeScenario(db: Database, options: ScenarioOptions = {}): Promise<Scenario> {
  const tag = randomBytes(4).toString('hex')
  const facility = await makeFacility(db, tag)
  const call = await makeCall(db, tag, facility, options)
  const people = await makePeople(db, tag, facility, call)
  const draft = await makeDraft(db, {
    reference: referenceFrom(randomBytes(5)),
    facility,
    call,
    pi: people.pi,
    coInvestigator: people.coInvestigator,
    ...(options.storage ? { storage: options.storage } : {}),
  })
  return { tag, ...facility, ...call, ...people, ...draft }
}
