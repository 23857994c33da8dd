import { createHash } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import { papersOf } from '@/db/queries/papers'
import type { Actor } from '@/lib/domain/actor'
import { readGiveaways } from '@/lib/domain/anonymity/readGiveaways'
import { newObjectKey } from '@/lib/domain/objects/objectKey'
import { readPaper } from '@/lib/domain/papers/readPaper'
import { removePaper } from '@/lib/domain/papers/removePaper'
import { uploadPaper } from '@/lib/domain/papers/uploadPaper'
import { readContents } from '@/lib/domain/proposals/readContents'
import { sweepObjects } from '@/lib/jobs/sweepObjects'
import { onEveryStep } from '@/lib/services/step'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { asFile, pdfWith } from '../../support/pdfs'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario
let storage: ReturnType<typeof memoryStore>

const as = (actor: Actor) => testContext(db(), actor, { storage })
const papers = () => papersOf(db(), scenario.proposalId)
const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex')

async function upload(
  bytes: Uint8Array,
  over: Partial<Parameters<typeof uploadPaper>[1]> = {},
  actor = scenario.pi,
) {
  return uploadPaper(as(actor), {
    reference: scenario.reference,
    kind: 'justification',
    file: asFile(bytes),
    sha256: sha256(bytes),
    sizeBytes: bytes.length,
    ...over,
  })
}

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
})

// Seen to fail: with the row written before the object, with the fingerprint unchecked, with removed papers listed.
describe('keeping a paper', () => {
  it('takes the place of the old one, whose bytes stay', async () => {
    const bytes = await pdfWith(['one', 'two'])
    const kept = await upload(bytes)
    expect(kept).toMatchObject({ pages: 2, fileName: 'quads-v5.pdf', replaced: 'lens-v6 (Sollvik).pdf' })
    expect(await papers()).toMatchObject([{ fileName: 'quads-v5.pdf', pages: 2, sha256: sha256(bytes) }])
    expect(storage.objects.size).toBe(2)
    expect([...storage.objects.keys()].every((key) => /^[0-9a-f/-]+$/.test(key))).toBe(true)
  })

  it('keeps the name of the file, never its path', async () => {
    const bytes = await pdfWith(['one'])
    await upload(bytes, { file: asFile(bytes, '../../etc/quads\u202e.pdf') })
    expect((await papers())[0]?.fileName).toBe('quads.pdf')
  })

  it.each([
    ['another fingerprint', { sha256: 'a'.repeat(64) }],
    ['another length', { sizeBytes: 12 }],
  ])('is refused when the browser says %s', async (_, over) => {
    const refusal = await refused(upload(await pdfWith(['one']), over))
    expect(refusal.fieldErrors.file).toContain('damaged on its way')
    expect(await papers()).toMatchObject([{ fileName: 'lens-v6 (Sollvik).pdf' }])
    expect(storage.objects.size).toBe(1)
  })

  it('is refused, and nothing changes, for a file that is no PDF', async () => {
    const picture = new Uint8Array([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3])
    expect((await refused(upload(picture))).fieldErrors.file).toContain('JPEG')
    expect(storage.objects.size).toBe(1)
  })

  it('does not reveal the proposal to a stranger, whatever the file', async () => {
    expect((await refused(upload(await pdfWith(['one']), {}, scenario.stranger))).kind).toBe('not-found')
  })

  it('says so when the store does not answer, and writes no row', async () => {
    onEveryStep((name) => {
      if (name === 'storage:put') throw new Error('down')
    })
    const refusal = await refused(upload(await pdfWith(['one'])))
    onEveryStep(null)
    expect(refusal.kind).toBe('unavailable')
    expect(await papers()).toMatchObject([{ fileName: 'lens-v6 (Sollvik).pdf' }])
  })

  it('is taken off, and may be added again', async () => {
    await removePaper(as(scenario.pi), { reference: scenario.reference, kind: 'justification' })
    expect(await papers()).toEqual([])
    await upload(await pdfWith(['one']))
    expect(await papers()).toHaveLength(1)
  })
})

describe('reading a paper', () => {
  it('gives investigators and the office the bytes, others nothing', async () => {
    const bytes = await pdfWith(['one'])
    const { paperId } = await upload(bytes)
    const input = { reference: scenario.reference, paperId }
    expect(sha256((await readPaper(as(scenario.office), input)).bytes)).toBe(sha256(bytes))
    expect((await refused(readPaper(as(scenario.stranger), input))).kind).toBe('not-found')
  })

  it('notices bytes that are not those that were kept', async () => {
    const { paperId } = await upload(await pdfWith(['one']))
    const [paper] = await papers()
    storage.objects.set(paper?.objectKey ?? '', new Uint8Array([1, 2, 3]))
    const refusal = await refused(readPaper(as(scenario.pi), { reference: scenario.reference, paperId }))
    expect(refusal.kind).toBe('integrity')
  })

  it('finds the names of the investigators, and says when it cannot look', async () => {
    await upload(await pdfWith(['See Sollvik 2026', 'nothing']))
    const contents = await readContents(db(), scenario.reference)
    const other = contents.papers.map((paper) => ({ ...paper, sha256: 'b'.repeat(64) }))
    expect(await readGiveaways({ storage: memoryStore() }, { ...contents, papers: other })).toMatchObject({
      isDocumentUnread: true,
    })
    expect(await readGiveaways({ storage }, contents)).toMatchObject({
      found: [{ kind: 'name', what: 'Maren Sollvik', places: [{ source: 'document', at: 1 }] }],
      isDocumentUnread: false,
    })
  })
})

describe('sweeping', () => {
  it('removes old objects without a row, and nothing else', async () => {
    await upload(await pdfWith(['one']))
    const random = { bytes: (length: number) => new Uint8Array(length).fill(7) }
    const lost = newObjectKey(random, new Date(Date.now() - 2 * 3_600_000))
    const fresh = newObjectKey({ bytes: (length) => new Uint8Array(length).fill(9) }, new Date())
    const foreign = 'a0/0123456789abcdef0123456789abcdef'
    for (const key of [lost, fresh, foreign]) storage.objects.set(key, new Uint8Array([1]))
    const before = storage.objects.size
    expect(await sweepObjects(db(), storage)).toBe(1)
    expect(storage.objects.has(lost)).toBe(false)
    expect(storage.objects.size).toBe(before - 1)
  })
})
