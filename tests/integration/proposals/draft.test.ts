import { beforeEach, describe, expect, it } from 'vitest'
import { entriesOf } from '@/db/queries/logbook'
import { constraintSetsOf } from '@/db/queries/observations'
import { findProposal } from '@/db/queries/proposals'
import type { Actor } from '@/lib/domain/actor'
import { beginProposal } from '@/lib/domain/proposals/beginProposal'
import { cosmologyFormOf } from '@/lib/domain/proposals/cosmologyForm'
import { listProposals } from '@/lib/domain/proposals/listProposals'
import { markSectionDone } from '@/lib/domain/proposals/markSectionDone'
import { putAwayDraft } from '@/lib/domain/proposals/putAwayDraft'
import { readContents } from '@/lib/domain/proposals/readContents'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { parseReference } from '@/lib/domain/proposals/reference'
import { saveCosmology, saveCosmologySchema } from '@/lib/domain/proposals/saveCosmology'
import { saveQuestion } from '@/lib/domain/proposals/saveQuestion'
import { takeBackDraft } from '@/lib/domain/proposals/takeBackDraft'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario, type ScenarioOptions } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario

const as = (actor: Actor) => testContext(db(), actor)
const day = 86_400_000
const question = {
  title: 'A new title',
  abstract: 'What is asked.',
  category: 'Gravitational lenses' as const,
}

beforeEach(async () => {
  scenario = await makeScenario(db())
})

// Seen to fail: without `takesProposals` in beginProposal, without the version in saveQuestion's guard,
// with `openForEditing` reading without asking its policy.
describe('beginning a proposal', () => {
  const begin = (title = 'Dust in the first galaxies') =>
    beginProposal(as(scenario.stranger), { kindId: scenario.kindId, title })

  it('makes a draft with its leader, its conditions and a sound reference', async () => {
    const { reference } = await begin()
    expect(parseReference(reference)).toBe(reference)
    const contents = await readContents(db(), reference)
    expect(contents).toMatchObject({
      state: 'draft',
      title: 'Dust in the first galaxies',
      cosmology: { id: 'planck-2018' },
      people: [{ role: 'pi', personId: scenario.stranger.personId, name: 'Ruta Winterhalt' }],
    })
    expect(contents.people[0]?.confirmedAt).toBeInstanceOf(Date)
    expect(await constraintSetsOf(db(), contents.id)).toHaveLength(1)
    expect(await entriesOf(db(), 'proposal', reference, 5)).toMatchObject([
      { action: 'proposal.begin', personId: scenario.stranger.personId },
    ])
  })

  it('opens the same draft when the button is pressed twice', async () => {
    const first = await begin()
    expect(await begin()).toEqual(first)
    expect(await begin('Another one')).not.toEqual(first)
  })

  it.each<[string, ScenarioOptions, string]>([
    ['closed', { closesAt: new Date(Date.now() - 1000), opensAt: new Date(Date.now() - day) }, 'closed at'],
    ['not yet open', { opensAt: new Date(Date.now() + day) }, 'is not open'],
    ['under review', { stage: 'review' }, 'is not open'],
  ])('is refused while the call is %s', async (_, options, words) => {
    const other = await makeScenario(db(), options)
    const refusal = await refused(beginProposal(as(other.pi), { kindId: other.kindId, title: 'Late' }))
    expect(refusal.kind).toBe('closed')
    expect(refusal.message).toContain(words)
  })

  it('is refused for a kind nobody offers', async () => {
    const refusal = await refused(beginProposal(as(scenario.pi), { kindId: 999_999_999, title: 'None' }))
    expect(refusal.fieldErrors).toHaveProperty('kindId')
  })
})

describe('saving the question', () => {
  const save = (actor: Actor, version: number, over: Partial<typeof question> = {}) =>
    saveQuestion(as(actor), { reference: scenario.reference, version, ...question, ...over })

  it('keeps it, raises the version and writes what changed', async () => {
    const saved = await save(scenario.pi, 1)
    expect(saved.version).toBe(2)
    expect(await findProposal(db(), scenario.reference)).toMatchObject({ ...question, version: 2 })
    const [entry] = await entriesOf(db(), 'proposal', scenario.reference, 1)
    expect(entry).toMatchObject({ action: 'proposal.question', after: question })
  })

  it('writes nothing when nothing changed', async () => {
    await save(scenario.pi, 1)
    const before = await entriesOf(db(), 'proposal', scenario.reference, 10)
    expect((await save(scenario.pi, 2)).version).toBe(2)
    expect(await entriesOf(db(), 'proposal', scenario.reference, 10)).toHaveLength(before.length)
  })

  it('shows the second of two writers what the first one wrote, and keeps it', async () => {
    await save(scenario.pi, 1)
    const refusal = await refused(save(scenario.coInvestigator, 1, { title: 'Mine' }))
    expect(refusal).toMatchObject({
      kind: 'stale',
      stale: { changedBy: 'Maren Sollvik', version: 2, theirs: question },
    })
    expect((await findProposal(db(), scenario.reference))?.title).toBe('A new title')
    expect((await save(scenario.coInvestigator, 2, { title: 'Mine' })).version).toBe(3)
  })

  it('says that it was oneself in another window', async () => {
    await save(scenario.pi, 1)
    const refusal = await refused(save(scenario.pi, 1, { title: 'Again' }))
    expect(refusal.stale?.changedBy).toBe('Another window of yours')
  })

  it('refuses an abstract longer than the kind takes, at the field, and changes nothing', async () => {
    const refusal = await refused(save(scenario.pi, 1, { abstract: 'x'.repeat(20_000) }))
    expect(refusal.fieldErrors.abstract).toMatch(/at most [\d,]+ characters/)
    expect(await findProposal(db(), scenario.reference)).toMatchObject({ version: 1 })
  })

  it.each(['stranger', 'chair', 'scientist'] as const)('does not exist for the %s', async (who) => {
    expect((await refused(save(scenario[who], 1))).kind).toBe('not-found')
    expect((await refused(readProposal(as(scenario[who]), scenario.reference))).kind).toBe('not-found')
  })

  it('is read by the office but not changed', async () => {
    expect((await readProposal(as(scenario.office), scenario.reference)).own).toBeNull()
    expect((await refused(save(scenario.office, 1))).kind).toBe('forbidden')
  })

  it('is refused a moment after the deadline, by the clock of the database', async () => {
    await db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: db().raw('UTC_TIMESTAMP(3)') as unknown as Date })
    const refusal = await refused(save(scenario.pi, 1))
    expect(refusal.kind).toBe('closed')
  })
})

describe('the cosmology', () => {
  const kept = async () => cosmologyFormOf((await readContents(db(), scenario.reference)).cosmology)
  const save = async (over: Partial<Awaited<ReturnType<typeof kept>>>, version = 1) =>
    saveCosmology(as(scenario.pi), {
      reference: scenario.reference,
      version,
      form: { ...(await kept()), ...over },
    })

  it('is kept with another beside it', async () => {
    await save({ choice: 'wmap-9', comparison: 'local-ladder' })
    expect((await readContents(db(), scenario.reference)).cosmology).toMatchObject({
      id: 'wmap-9',
      comparisonId: 'local-ladder',
      parameters: { H0: 69.32, Om0: 0.2865 },
    })
  })

  // Seen to fail with the choice left out of what the action takes.
  it('takes massive neutrinos off a matter density said to count them', async () => {
    const form = { ...(await kept()), choice: 'custom', name: 'Ours', Om0: '0.3', omCounts: 'all' as const }
    const asSent = saveCosmologySchema.parse({ reference: scenario.reference, version: 1, form })
    await saveCosmology(as(scenario.pi), asSent)
    const { parameters } = (await readContents(db(), scenario.reference)).cosmology
    expect(parameters.Om0).toBeLessThan(0.2999)
    expect(parameters.Om0).toBeGreaterThan(0.29)
  })

  it('may be one’s own, curved and with a true minus', async () => {
    await save({ choice: 'custom', name: 'Ours', H0: '70', Om0: '0.4', Ode0: '0.9', w0: '−1.1' })
    expect((await readContents(db(), scenario.reference)).cosmology).toMatchObject({
      id: 'custom',
      parameters: { name: 'Ours', Om0: 0.4, Ode0: 0.9, w0: -1.1 },
    })
  })

  it('refuses what the engine refuses, in its words, at the field', async () => {
    const refusal = await refused(save({ choice: 'custom', H0: '-5' }))
    expect(refusal.fieldErrors).toEqual({ H0: 'The Hubble constant H₀ must be above 0 km/s/Mpc.' })
    expect((await kept()).choice).toBe('planck-2018')
  })
})

describe('sections and the draft as a whole', () => {
  it('are marked done and opened again', async () => {
    const mark = (done: boolean) =>
      markSectionDone(as(scenario.pi), { reference: scenario.reference, section: 'question', done })
    await mark(false)
    expect((await readContents(db(), scenario.reference)).sectionsDone).not.toContain('question')
    await mark(true)
    expect((await readContents(db(), scenario.reference)).sectionsDone).toContain('question')
  })

  it('is put away and taken back as it was', async () => {
    const input = { reference: scenario.reference }
    await putAwayDraft(as(scenario.pi), input)
    expect((await listProposals(as(scenario.pi))).rows).toMatchObject([{ isPutAway: true, isOpen: false }])
    expect((await refused(putAwayDraft(as(scenario.pi), input))).kind).toBe('closed')
    await takeBackDraft(as(scenario.pi), input)
    expect(await findProposal(db(), scenario.reference)).toMatchObject({
      state: 'draft',
      withdrawn_at: null,
      withdrawn_reason: null,
    })
  })

  it('is not taken back when it was withdrawn for another reason', async () => {
    await db()('proposals')
      .where({ id: scenario.proposalId })
      .update({ state: 'withdrawn', withdrawn_reason: 'We got the data elsewhere.' })
    const refusal = await refused(takeBackDraft(as(scenario.pi), { reference: scenario.reference }))
    expect(refusal.kind).toBe('closed')
  })

  it('is not put away by a co-investigator who may only write', async () => {
    const refusal = await refused(
      putAwayDraft(as(scenario.coInvestigator), { reference: scenario.reference }),
    )
    expect(refusal.kind).toBe('forbidden')
  })

  it('is listed for those it names, with its hours, and for nobody else', async () => {
    const { rows } = await listProposals(as(scenario.coInvestigator))
    expect(rows).toMatchObject([
      {
        reference: scenario.reference,
        askedSeconds: 7200,
        targets: 1,
        lead: 'Maren Sollvik',
        isLead: false,
        isOpen: true,
      },
    ])
    expect((await listProposals(as(scenario.stranger))).rows).toEqual([])
  })
})
