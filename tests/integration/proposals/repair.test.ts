import { createHash } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import { readSnapshot } from '@/db/queries/versions'
import type { Actor } from '@/lib/domain/actor'
import { closeRepair } from '@/lib/domain/papers/closeRepair'
import { openRepair } from '@/lib/domain/papers/openRepair'
import { readRepairs } from '@/lib/domain/papers/readRepairs'
import { replacePaper } from '@/lib/domain/papers/replacePaper'
import { readPacket } from '@/lib/domain/packets/readPacket'
import { makeClosedCall, type ClosedCall } from '../../support/closedCall'
import { useRolledBackDatabase } from '../../support/database'
import { pdfText } from '../../support/pdfText'
import { asFile, pdfWith } from '../../support/pdfs'
import { refused } from '../../support/refused'

// Seen to fail: a repair used twice, the stamp of arrival left out, and what a reopened draft says taken into the
// version.

const db = useRolledBackDatabase()
const hour = 3600_000
let closed: ClosedCall

beforeEach(async () => {
  closed = await makeClosedCall(db())
})

const open = (
  over: { openUntil?: Date; kind?: 'justification' | 'team-expertise' } = {},
  actor: Actor = closed.office,
) =>
  openRepair(closed.as(actor), {
    reference: closed.reference,
    kind: over.kind ?? 'justification',
    openUntil: over.openUntil ?? new Date(Date.now() + hour),
    reason: 'The file of another proposal was sent.',
  })

const replace = async (words: string, actor?: Actor, arrivedAt?: Date) =>
  replaceBy(await pdfWith([words]), actor, arrivedAt)

async function replaceBy(bytes: Uint8Array, actor: Actor = closed.pi, arrivedAt = new Date()) {
  return replacePaper(
    closed.as(actor),
    {
      reference: closed.reference,
      kind: 'justification',
      file: asFile(bytes),
      sha256: createHash('sha256').update(bytes).digest('hex'),
      sizeBytes: bytes.length,
    },
    arrivedAt,
  )
}

const standing = async () => {
  const version = await readSnapshot(db(), closed.proposalId)
  if (!version) throw new Error('nothing stands')
  return version
}

describe('a wrong file', () => {
  it('is replaced once, as a new version that differs in nothing else; both are kept', async () => {
    const [reviewer] = closed.reviewers
    await closed.assign(reviewer)
    const before = await standing()
    expect((await refused(replace('The right one'))).message).toMatch(/has not opened this paper/)
    await open()
    await replace('The right one')

    const after = await standing()
    expect(after.versionNumber).toBe(2)
    expect({ ...after.snapshot.contents, papers: [] }).toEqual({ ...before.snapshot.contents, papers: [] })
    expect(after.snapshot.computation).toEqual(before.snapshot.computation)
    expect(after.snapshot.contents.papers).toMatchObject([{ fileName: 'quads-v5.pdf', pages: 1 }])
    const versions = await db()('proposal_versions').where({ proposal_id: closed.proposalId })
    expect(versions.map((row) => row.superseded_at === null)).toEqual([false, true])
    expect(await db()('papers').where({ proposal_id: closed.proposalId })).toHaveLength(2)

    const packet = await readPacket(closed.as(closed.office), {
      reference: closed.reference,
      variant: 'anonymised',
    })
    expect(await pdfText(packet.bytes)).toContain('The right one')
    expect((await refused(replace('A third one'))).message).toMatch(/has not opened this paper/)

    const letters = await db()('outbox').whereIn('template', ['repair-opened', 'paper-replaced'])
    expect(letters.map((letter) => [letter.template, letter.to_email])).toEqual([
      ['repair-opened', closed.pi.email],
      ['paper-replaced', reviewer.email],
    ])
    expect(letters[1]?.text_body).not.toContain(closed.reference)
    const entry = await db()('logbook').where({ action: 'papers.repair' }).first()
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject({
      version: 2,
      reason: 'The file of another proposal was sent.',
    })
  })

  it('takes nothing else from a draft that was reopened and not sent again', async () => {
    await db()('proposals').where({ id: closed.proposalId }).update({ is_reopened: 1, title: 'Another' })
    await open()
    await replace('The right one')
    expect((await standing()).snapshot.contents).toMatchObject({ title: 'Broad lines behind a lens' })
  })

  it('is held against the stamp of arrival, and against being closed again', async () => {
    const openUntil = new Date(Date.now() + hour)
    await open({ openUntil })
    expect((await refused(replace('Late', closed.pi, openUntil))).message).toMatch(/its time is over/)
    const [repair] = await readRepairs(closed.as(closed.office), closed.reference)
    const close = () =>
      closeRepair(closed.as(closed.office), { reference: closed.reference, repairId: repair?.id ?? 0 })
    await close()
    expect((await refused(replace('Closed'))).kind).toBe('closed')
    expect((await refused(close())).kind).toBe('closed')
    await open()
    await replace('Opened again')
    expect((await standing()).versionNumber).toBe(2)
  })

  it('is looked through like any other', async () => {
    await open()
    const longer = await pdfWith(['1', '2', '3', '4', '5'])
    const sent = replaceBy(longer)
    expect((await refused(sent)).fieldErrors.file).toBe(
      'The PDF has 5 pages; this document may have four pages.',
    )
    expect((await standing()).versionNumber).toBe(1)
  })
})

describe('who and when', () => {
  it('opened by the office alone, replaced by those who lead', async () => {
    for (const actor of [closed.pi, closed.chair, closed.reviewers[0]])
      expect((await refused(open({}, actor))).kind).toBe('forbidden')
    await open()
    expect((await refused(replace('x', closed.coInvestigator))).kind).toBe('forbidden')
    expect((await refused(replace('x', closed.office))).kind).toBe('forbidden')
    expect((await refused(replace('x', closed.reviewers[0]))).kind).toBe('not-found')
  })

  it('after the deadline, before the ranking, one paper at a time', async () => {
    expect((await refused(open({ openUntil: new Date(Date.now() - 1) }))).fieldErrors.openUntil).toBeTruthy()
    expect((await refused(open({ openUntil: new Date('2099-01-01') }))).fieldErrors.openUntil).toMatch(
      /panel meets/,
    )
    expect((await refused(open({ kind: 'team-expertise' }))).fieldErrors.kind).toMatch(/no such paper/)
    await open()
    expect((await refused(open())).fieldErrors.kind).toMatch(/open for a replacement already/)
    await db()('calls').where({ id: closed.callId }).update({ stage: 'ranking' })
    expect((await refused(open())).message).toMatch(/being ranked/)
    await db()('calls')
      .where({ id: closed.callId })
      .update({ stage: 'published', closes_at: new Date(Date.now() + hour) })
    expect((await refused(open())).message).toMatch(/can reopen it/)
  })
})
