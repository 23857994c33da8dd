import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { packetFor } from '@/lib/domain/packets/packetFor'
import { computeProposal } from '@/lib/domain/observations/computeProposal'
import { readPacket } from '@/lib/domain/packets/readPacket'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { readVersionChanges } from '@/lib/domain/proposals/history/readVersionChanges'
import { readContents } from '@/lib/domain/proposals/readContents'
import { removePaper } from '@/lib/domain/papers/removePaper'
import { findVersion } from '@/db/queries/versions'
import { reopenProposal } from '@/lib/domain/submission/reopenProposal'
import { saveWriting, type SaveWritingInput } from '@/lib/domain/writings/saveWriting'
import { uploadFigure } from '@/lib/domain/writings/uploadFigure'
import { pagesToRead } from '@/db/queries/assignments'
import { databaseNow } from '@/db/queries/clock'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { pdfInfo, pdfPictures, pdfText } from '../../support/pdfText'
import { asUpload, photograph } from '../../support/pictures'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
let scenario: Scenario
let storage: ReturnType<typeof memoryStore>

const as = (actor: Actor) => testContext(db(), actor, { storage })
const save = (over: Partial<SaveWritingInput> = {}, actor = scenario.pi) =>
  saveWriting(as(actor), {
    reference: scenario.reference,
    part: 'justification',
    text: 'Why $z > 2$ matters.',
    version: 0,
    ...over,
  })
const writings = async () => (await readContents(db(), scenario.reference)).writings

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
})

// Seen to fail: with the version unchecked, with the logbook given the text itself.
describe('keeping a text', () => {
  it('counts its versions by part, and tells its length in the history', async () => {
    expect(await save()).toMatchObject({ version: 1 })
    expect(await save({ text: 'Why it matters more.', version: 1 })).toMatchObject({ version: 2 })
    expect(await save({ part: 'team', text: 'We.' })).toMatchObject({ version: 1 })
    expect(await writings()).toMatchObject({
      justification: { text: 'Why it matters more.', version: 2 },
      references: { text: '', version: 0 },
      team: { text: 'We.', version: 1 },
    })
    const contents = await readContents(db(), scenario.reference)
    const { changes } = await readHistory(as(scenario.pi), contents)
    expect(changes.slice(0, 2).map(({ words }) => words)).toEqual([
      'On the team: 0 to one word',
      'Justification: 0 to four words',
    ])
    const rows = await db()('logbook').where({ action: 'writing.save' })
    expect(rows).toHaveLength(3)
    expect(JSON.stringify(rows)).not.toContain('matters')
  })

  it('shows whoever comes second what stands, and overwrites nothing', async () => {
    await save({}, scenario.coInvestigator)
    const refusal = await refused(save({ text: 'Mine.' }))
    expect(refusal).toMatchObject({
      kind: 'stale',
      stale: {
        changedBy: scenario.coInvestigator.name,
        version: 1,
        theirs: { text: 'Why $z > 2$ matters.' },
      },
    })
    expect((await writings()).justification.text).toBe('Why $z > 2$ matters.')
  })

  it('writes nothing when nothing differs, and keeps a text of any number of words', async () => {
    await save()
    expect(await save({ version: 1 })).toMatchObject({ version: 1 })
    const long = 'word '.repeat(9000)
    await save({ text: long, version: 1 })
    expect((await writings()).justification.text).toBe(long)
  })

  it('is for its writers, while it is open', async () => {
    expect((await refused(save({}, scenario.stranger))).kind).toBe('not-found')
    expect((await refused(save({}, scenario.office))).kind).toBe('forbidden')
    await sendIn(as(scenario.pi), scenario.reference)
    expect((await refused(save())).message).toContain('has been sent')
  })
})

const text = `# Aim

Lenses at $z = 2.3 \\pm 0.1$ weigh their hosts [@ost; @bell], see [@fig:field-map].

$$
M = f \\frac{R\\,\\Delta V^2}{G}
$$`
const bibtex = `@article{bell, author={Bell, Kim}, title={On lenses}, journal=mnras, volume=12, year=2031}
@article{ost, author={{\\"O}st, K}, title={Delays}, journal=apj, volume=1, year=2030}`

async function writeInstead(): Promise<void> {
  const { reference } = scenario
  await removePaper(as(scenario.pi), { reference, kind: 'justification' })
  await save({ text })
  await save({ part: 'references', text: bibtex })
  await uploadFigure(as(scenario.pi), asUpload(reference, await photograph()))
}

// Seen to fail: with the packet asking for a document, with figures read from the draft, with the limit unchecked.
describe('a text sent in the place of a document', () => {
  it('is asked for when neither is there, and held to its words', async () => {
    await removePaper(as(scenario.pi), { reference: scenario.reference, kind: 'justification' })
    const none = await refused(sendIn(as(scenario.pi), scenario.reference))
    expect(none.fieldErrors.papers).toBe('Write the justification, or add it as a PDF.')
    await save({ text: 'word '.repeat(2003) })
    const long = await refused(sendIn(as(scenario.pi), scenario.reference))
    expect(long.fieldErrors.papers).toBe('Shorten the justification by three words.')
  })

  it('is frozen, set into the packet with figure and references, and read without names', async () => {
    await writeInstead()
    const { versionId } = await sendIn(as(scenario.pi), scenario.reference)
    const sent = await findVersion(db(), versionId)
    expect(sent).toMatchObject({
      paperId: null,
      snapshot: { contents: { writings: { justification: { text } }, figures: [{ label: 'field-map' }] } },
    })
    const { bytes } = await packetFor(as(scenario.pi), versionId, 'anonymised')
    const printed = pdfText(bytes)
    expect(printed).toContain('weigh their hosts [1, 2], see Figure 1.')
    expect(printed).toMatch(/\[1\] +Öst K\. 2030\. Delays\. ApJ, 1\./)
    expect(printed).toMatch(/\[2\] +Bell K\. 2031\. On lenses\. MNRAS, 12\./)
    // Turned as the camera held it.
    expect(pdfPictures(bytes)).toMatch(/ 50 +80 /)
    expect(pdfInfo(bytes)).not.toMatch(/^(Author|Creator|CreationDate|ModDate):/m)
    for (const identity of ['Sollvik', 'Pellering', scenario.reference, 'Field map'])
      expect(printed + Buffer.from(bytes).toString('latin1')).not.toContain(identity)
    expect(await pagesToRead(db(), [scenario.proposalId])).toEqual(new Map([[scenario.proposalId, 1]]))
  })

  it('is carried by the reopened draft, while what was sent stands', async () => {
    await writeInstead()
    const { versionId } = await sendIn(as(scenario.pi), scenario.reference)
    const { reference } = scenario
    await reopenProposal(as(scenario.pi), { reference, arrivedAt: await databaseNow(db()) })
    expect((await writings()).justification.text).toBe(text)
    await save({ text: 'Another text altogether.', version: 1 })
    expect((await findVersion(db(), versionId))?.snapshot.contents.writings.justification.text).toBe(text)
    const now = await readContents(db(), reference)
    const since = await readVersionChanges(
      as(scenario.pi),
      { contents: now, computation: computeProposal(now) },
      1,
    )
    expect(since).toMatchObject({ from: 1, to: null, parts: [{ part: 'justification' }] })
    const without = (kind: string) =>
      since?.parts[0]?.differences.map((one) => (one.kind === kind ? '' : one.text)).join('')
    expect([without('new'), without('gone')]).toEqual([text, 'Another text altogether.'])
    const preview = await readPacket(as(scenario.pi), { reference, variant: 'anonymised' })
    expect(pdfText(preview.bytes)).toContain('Another text altogether.')
    const standing = await packetFor(as(scenario.pi), versionId, 'anonymised')
    expect(pdfText(standing.bytes)).toContain('weigh their hosts')
  })

  it('gives way to a document that stands', async () => {
    await save({ text: 'Kept, not sent.' })
    const { versionId } = await sendIn(as(scenario.pi), scenario.reference)
    const { bytes } = await packetFor(as(scenario.pi), versionId, 'anonymised')
    expect(pdfText(bytes)).toContain('Justification, sheet 2')
    expect(pdfText(bytes)).not.toContain('Kept, not sent.')
  })
})
