import { randomBytes } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { readClashes } from '@/lib/domain/observations/readClashes'
import { readContents } from '@/lib/domain/proposals/readContents'
import { referenceFrom } from '@/lib/domain/proposals/reference'
import { award } from '../../support/award'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makeDraft, type ScenarioDraft } from '../../support/scenario/draft'
import { makePerson } from '../../support/scenario/people'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
let scenario: Scenario
/** Of other people: the same target in the same mode for the same time. */
let theirs: ScenarioDraft
let them: Actor
let storage: ReturnType<typeof memoryStore>

const as = (actor: Actor) => testContext(db(), actor, { storage })
const found = async (actor = scenario.pi) =>
  readClashes(as(actor), await readContents(db(), scenario.reference))
const awardTheirs = (over: { seconds?: number; releasedAt?: Date | null } = {}) =>
  award(db(), { proposalId: theirs.proposalId, instrumentId: scenario.instrumentId, seconds: 7200, ...over })

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
  them = await makePerson(db(), scenario.tag, 'Linnea Vastergard')
  const other = await makePerson(db(), scenario.tag, 'Piet Zandwijk')
  theirs = await makeDraft(db(), {
    reference: referenceFrom(randomBytes(5)),
    facility: scenario,
    call: scenario,
    pi: them,
    coInvestigator: other,
    storage,
  })
})

// Seen to fail: with the state of the other proposal not asked, and with the release of the decision not asked.
describe('what an author may not learn of others', () => {
  it('is anything of a draft', async () => {
    expect(await found()).toEqual([])
  })

  it.each(['submitted', 'under-review', 'reserve', 'declined', 'withdrawn', 'lapsed'] as const)(
    'is anything of a proposal that is %s',
    async (state) => {
      await sendIn(as(them), theirs.reference)
      await db()('proposals').where({ id: theirs.proposalId }).update({ state })
      expect(await found()).toEqual([])
    },
  )

  it('is a decision that is not made known', async () => {
    await sendIn(as(them), theirs.reference)
    await awardTheirs({ releasedAt: null })
    expect(await found()).toEqual([])
    // Not even should the state have run ahead of the letters.
    await db()('proposals').where({ id: theirs.proposalId }).update({ state: 'awarded' })
    expect(await found()).toEqual([])
  })

  it('is who, what, where or how long: the reference of the award is all', async () => {
    await sendIn(as(them), theirs.reference)
    await awardTheirs()
    expect(await found()).toEqual([
      { observationId: scenario.observationId, kind: 'awarded', reference: theirs.reference },
    ])
  })

  it('is what was edited after the version that was awarded', async () => {
    await db()('targets').where({ id: theirs.targetId }).update({ dec_deg: 10 })
    await sendIn(as(them), theirs.reference)
    await awardTheirs()
    await db()('targets').where({ id: theirs.targetId }).update({ dec_deg: -45.6075278 })
    expect(await found()).toEqual([])
  })

  it('is anything at all for somebody who is not named', async () => {
    await sendIn(as(them), theirs.reference)
    await awardTheirs()
    expect(await found(scenario.stranger)).toEqual([])
    expect(await found(scenario.office)).toEqual([])
  })
})

describe('a clash with an award', () => {
  beforeEach(async () => {
    await sendIn(as(them), theirs.reference)
  })

  it('is none where much less time was given', async () => {
    await awardTheirs({ seconds: 3500 })
    expect(await found()).toEqual([])
  })

  it('is none in another place or mode', async () => {
    await awardTheirs()
    await db()('targets').where({ id: scenario.targetId }).update({ ra_deg: 306.55 })
    expect(await found()).toEqual([])
  })
})

describe('a clash with what is one’s own', () => {
  it('names the other proposal to those it names, awarded or not', async () => {
    await db()('proposal_people').insert({
      proposal_id: theirs.proposalId,
      person_id: scenario.pi.personId,
      name: scenario.pi.name,
      email: scenario.pi.email,
      role: 'co-investigator',
      position: 3,
      confirmed_at: new Date(),
    })
    const own = {
      observationId: scenario.observationId,
      kind: 'own',
      reference: theirs.reference,
      callNumber: scenario.callNumber,
    }
    expect(await found()).toEqual([own])
    expect(await found(scenario.coInvestigator)).toEqual([])
    await sendIn(as(them), theirs.reference)
    await awardTheirs()
    expect(await found()).toEqual([own])
    expect((await found(scenario.coInvestigator)).map(({ kind }) => kind)).toEqual(['awarded'])
  })
})
