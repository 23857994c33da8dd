import { createHash } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import { insertFigure } from '@/db/queries/figures'
import { findProposal } from '@/db/queries/proposals'
import { insertStoredObject } from '@/db/queries/storedObjects'
import { insertGroup, putInGroup } from '@/db/queries/targetGroups'
import { insertWish } from '@/db/queries/wishes'
import { putWriting } from '@/db/queries/writings'
import type { Actor } from '@/lib/domain/actor'
import { continueProposal } from '@/lib/domain/continuation/continueProposal'
import { readContinuation } from '@/lib/domain/continuation/readContinuation'
import { readProgramme } from '@/lib/domain/continuation/readProgramme'
import { storedBytes } from '@/lib/domain/papers/storedBytes'
import { confirmMembership } from '@/lib/domain/proposals/confirmMembership'
import { listProposals } from '@/lib/domain/proposals/listProposals'
import { putAwayDraft } from '@/lib/domain/proposals/putAwayDraft'
import { readContents } from '@/lib/domain/proposals/readContents'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { takeBackDraft } from '@/lib/domain/proposals/takeBackDraft'
import { refuse } from '@/lib/errors'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makeCall, type ScenarioCall } from '../../support/scenario/call'

const db = useRolledBackDatabase()
const day = 86_400_000
let scenario: Scenario
let next: ScenarioCall
let storage: ReturnType<typeof memoryStore>

const as = (actor: Actor) => testContext(db(), actor, { storage })
const carryOn = (actor = scenario.pi, kindId = next.kindId) =>
  continueProposal(as(actor), { reference: scenario.reference, kindId })
const contents = (reference: string) => readContents(db(), reference)
const programme = async (actor: Actor, reference: string) =>
  readProgramme(as(actor), await contents(reference))

/** An earlier call that has closed, and a later one that is open. */
beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), {
    storage,
    opensAt: new Date(Date.now() - 60 * day),
    closesAt: new Date(Date.now() - 30 * day),
  })
  next = await makeCall(db(), `${scenario.tag}b`, scenario, { month: '2028-01' })
})

// Seen to fail: without the programme, with people agreed at once, with the object shared, without the lock's check,
// and with the groups, the texts or the wishes left behind.
describe('carrying a proposal on', () => {
  it('begins a draft of the same programme with all that it said', async () => {
    const { reference } = await carryOn()
    const [was, is] = [await contents(scenario.reference), await contents(reference)]
    expect(is).toMatchObject({ state: 'draft', title: was.title, abstract: was.abstract, sectionsDone: [] })
    expect(is.call.id).toBe(next.callId)
    const bare = (target: (typeof is.targets)[number]) => ({ ...target, id: 0 })
    expect(is.targets.map(bare)).toEqual(was.targets.map(bare))
    expect(is.targets[0]?.id).not.toBe(was.targets[0]?.id)
    expect(is.observations).toMatchObject([
      { targetId: is.targets[0]?.id, constraintSetId: is.constraintSets[0]?.id, askedSeconds: 7200 },
    ])
    const rows = [await findProposal(db(), was.id), await findProposal(db(), is.id)]
    expect(rows[1]?.programme_id).toBe(rows[0]?.programme_id)
    expect(rows[1]?.continues_id).toBe(was.id)
    expect(was.people).toHaveLength(2)
  })

  it('asks the people anew, by letter, with whoever carries it on in the lead', async () => {
    const { reference } = await carryOn()
    const { people } = await contents(reference)
    expect(people.map(({ name, role, confirmedAt }) => [name, role, confirmedAt !== null])).toEqual([
      ['Maren Sollvik', 'pi', true],
      ['Odo Pellering', 'co-investigator', false],
    ])
    const letter = await db()('outbox')
      .where({ template: 'named-on-proposal', to_email: scenario.coInvestigator.email })
      .orderBy('id', 'desc')
      .first()
    expect(letter?.text_body).toContain(`/proposals/${reference}/people`)
    expect((await readProposal(as(scenario.coInvestigator), reference)).readOnly).toContain('Agree')
  })

  it('lets a deputy carry it on, who then leads', async () => {
    await db()('proposal_people')
      .where({ proposal_id: scenario.proposalId, person_id: scenario.coInvestigator.personId })
      .update({ access: 'deputy' })
    const { reference } = await carryOn(scenario.coInvestigator)
    expect((await contents(reference)).people.map(({ name, role, access }) => [name, role, access])).toEqual([
      ['Odo Pellering', 'pi', 'deputy'],
      ['Maren Sollvik', 'co-investigator', 'deputy'],
    ])
  })

  it('copies the paper under a key of its own, byte for byte', async () => {
    const { reference } = await carryOn()
    const [was, is] = [await contents(scenario.reference), await contents(reference)]
    expect(is.papers[0]?.objectKey).not.toBe(was.papers[0]?.objectKey)
    const bytes = await Promise.all(
      [was, is].map(({ papers }) => storedBytes(as(scenario.pi), papers[0] ?? { objectKey: '', sha256: '' })),
    )
    expect(Buffer.from(bytes[1] ?? [])).toEqual(Buffer.from(bytes[0] ?? []))
  })

  it('brings the texts, figures, groups and wishes along, each the new proposal’s own', async () => {
    const { id, targets, modes } = await contents(scenario.reference)
    const text = 'Why ice forms so early, see [@fig:ice].'
    await putWriting(db(), { proposalId: id, part: 'justification', text, version: 0 })
    await putWriting(db(), { proposalId: id, part: 'team', text: 'Two of us built it.', version: 0 })
    const groupId = await insertGroup(db(), id, {
      ...{ name: 'Ice', rule: 'at-least', atLeast: 1, hoursFor: 'at-least' },
    })
    await putInGroup(db(), [targets[0]?.id ?? 0], groupId)
    const instrumentId = modes[0]?.instrument.id ?? 0
    const wish = { leastSeconds: 5400, visit: { nights: 2, part: 'first', together: false } } as const
    await insertWish(db(), id, instrumentId, wish)
    const bytes = new TextEncoder().encode('a picture')
    const sha256 = createHash('sha256').update(bytes).digest('hex')
    await storage.put('old-figure', bytes, 'image/png')
    const stored = { key: 'old-figure', sha256, sizeBytes: bytes.length, contentType: 'image/png' }
    const objectId = await insertStoredObject(db(), { ...stored, purpose: 'figure' })
    const drawn = {
      label: 'ice',
      caption: 'Ice.',
      fileName: 'ice.png',
      widthPx: 40,
      heightPx: 30,
      position: 1,
    }
    await insertFigure(db(), { proposalId: id, objectId, ...drawn })

    const { reference } = await carryOn()
    const [was, is] = [await contents(scenario.reference), await contents(reference)]
    expect(is.writings).toEqual(was.writings)
    expect(is.figures).toMatchObject([{ ...drawn, sha256, version: 1 }])
    expect(is.figures[0]?.objectKey).not.toBe('old-figure')
    expect(is.groups.map((group) => ({ ...group, id: 0 }))).toEqual(
      was.groups.map((group) => ({ ...group, id: 0 })),
    )
    expect(is.groups[0]?.id).not.toBe(groupId)
    expect(is.targets[0]?.group).toBe('Ice')
    expect(is.wishes).toMatchObject([{ instrumentId, ...wish, version: 1 }])
    expect(await db()('targets').where({ group_id: groupId, proposal_id: is.id })).toEqual([])
  })

  it('asks for the paper anew where the store does not give it', async () => {
    storage.get = () => Promise.reject(refuse.unavailable('object store'))
    const { reference } = await carryOn()
    expect((await contents(reference)).papers).toEqual([])
    const { notes } = await programme(scenario.pi, reference)
    expect(notes.map(({ sentence, todo }) => `${sentence} ${todo}`)).toContain(
      `The justification of call ${scenario.callNumber} is not here. Add it anew.`,
    )
  })

  it('keeps a mode that is gone where it is mended, and bars sending until it is', async () => {
    await db()('call_modes').where({ call_id: next.callId }).delete()
    const { reference } = await carryOn()
    const { notes } = await programme(scenario.pi, reference)
    expect(notes.find(({ section }) => section === 'observing')?.sentence).toContain(
      'is not on offer in this call',
    )
    const { sections } = await readProposal(as(scenario.pi), reference)
    expect(sections.find(({ section }) => section === 'observing')?.missing[0]?.sentence).toContain(
      'The mode asked for is not on offer in this call.',
    )
  })

  it('opens the draft just begun when the button is pressed twice', async () => {
    const first = await carryOn()
    expect(await carryOn()).toEqual(first)
  })

  it('stands in the logbook with where it comes from', async () => {
    const { reference } = await carryOn()
    const row = await db()('logbook').where({ action: 'proposal.continue', subject_id: reference }).first()
    expect(JSON.parse(row?.before_value ?? '{}')).toMatchObject({
      reference: scenario.reference,
      call: scenario.callNumber,
    })
  })
})

describe('a proposal that cannot be carried on', () => {
  it('is not a stranger’s, an editor’s, the office’s or a reviewer’s', async () => {
    expect((await refused(carryOn(scenario.stranger))).kind).toBe('not-found')
    expect((await refused(carryOn(scenario.reviewers[0]))).kind).toBe('not-found')
    expect((await refused(carryOn(scenario.coInvestigator))).kind).toBe('forbidden')
    expect((await refused(carryOn(scenario.office))).kind).toBe('forbidden')
  })

  it('finds no open call', async () => {
    await db()('calls')
      .where({ id: next.callId })
      .update({ closes_at: new Date(Date.now() - day) })
    await db()('calls')
      .where('stage', 'published')
      .andWhereNot({ id: next.callId })
      .update({ stage: 'archived' })
    expect((await refused(carryOn())).message).toContain(`Call ${next.callNumber} closed at`)
    const { kinds, whyNot } = await readContinuation(as(scenario.pi), scenario.reference)
    expect(kinds).toEqual([])
    expect(whyNot).toContain('No other call is open.')
  })

  it('is of the open call itself', async () => {
    await db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: new Date(Date.now() + day) })
    expect((await refused(carryOn(scenario.pi, scenario.kindId))).message).toContain('is of call')
  })

  it('was carried on already, which is named to those who may read it alone', async () => {
    const { reference } = await carryOn()
    await db()('proposals')
      .where({ reference })
      .update({ created_at: new Date(Date.now() - day) })
    expect((await refused(carryOn())).message).toBe(
      `This programme has a proposal in call ${next.callNumber} already: ${reference}.`,
    )
    await db()('proposal_people')
      .where({ proposal_id: scenario.proposalId, person_id: scenario.coInvestigator.personId })
      .update({ access: 'deputy' })
    await db()('proposal_people')
      .where({ person_id: scenario.coInvestigator.personId })
      .whereNot({ proposal_id: scenario.proposalId })
      .delete()
    expect((await refused(carryOn(scenario.coInvestigator))).message).toBe(
      `This programme has a proposal in call ${next.callNumber} already.`,
    )
  })

  it('may be, once the other draft is put away; which then stays away', async () => {
    const { reference } = await carryOn()
    await putAwayDraft(as(scenario.pi), { reference })
    const second = await carryOn()
    expect(second.reference).not.toBe(reference)
    expect((await refused(takeBackDraft(as(scenario.pi), { reference }))).message).toContain(
      'Another proposal of this programme',
    )
  })
})

describe('the programme', () => {
  it('lists its other proposals for those they name, once they have agreed', async () => {
    const { reference } = await carryOn()
    expect((await programme(scenario.pi, reference)).others).toMatchObject([
      { reference: scenario.reference, callNumber: scenario.callNumber, awardedSeconds: null },
    ])
    expect(await programme(scenario.coInvestigator, reference)).toEqual({
      others: [],
      continues: null,
      notes: [],
    })
    await confirmMembership(as(scenario.coInvestigator), { reference })
    expect((await programme(scenario.coInvestigator, reference)).others).toHaveLength(1)
    expect((await programme(scenario.office, reference)).others).toEqual([])
  })

  it('does not tell a new member of a proposal that does not name them', async () => {
    const { reference } = await carryOn()
    const { id } = await contents(reference)
    await db()('proposal_people').insert({
      proposal_id: id,
      person_id: scenario.stranger.personId,
      name: 'Ruta Winterhalt',
      email: scenario.stranger.email,
      role: 'co-investigator',
      position: 3,
      confirmed_at: new Date(),
    })
    const view = await programme(scenario.stranger, reference)
    expect(view.others).toEqual([])
    expect(view.continues).toEqual({ callNumber: scenario.callNumber })
  })

  it('is offered in the table of proposals until it is carried on', async () => {
    const rowOf = async () =>
      (await listProposals(as(scenario.pi))).rows.find(({ reference }) => reference === scenario.reference)
    expect((await rowOf())?.continueIn).toBeGreaterThanOrEqual(next.callNumber)
    await db()('calls').whereNot({ id: next.callId }).update({ stage: 'archived' })
    expect((await rowOf())?.continueIn).toBe(next.callNumber)
    await carryOn()
    expect((await rowOf())?.continueIn).toBeNull()
  })
})
