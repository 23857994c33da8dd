import { PDFDict, PDFDocument, PDFHexString, PDFName, PDFString } from 'pdf-lib'
import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { saveAward } from '@/lib/domain/decisions/saveAward'
import { discussNow } from '@/lib/domain/discussions/discussNow'
import { setPresence } from '@/lib/domain/discussions/setPresence'
import { readReportFile } from '@/lib/domain/panelReports/readReportFile'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { moveInRanking } from '@/lib/domain/rankings/moveInRanking'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { csvRows } from '../../support/csvRows'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'
import { pdfInfo, pdfText } from '../../support/pdfText'
import { makeTwoPanels } from '../../support/twoPanels'

// Seen to fail with the whole panel's proposals given to the chair's file, with a list that is not frozen reported, and
// with small counts shown.

const db = useRolledBackDatabase()
let call: PanelCall
let p: PanelProposalMade[]
const reason = 'Its targets set early, and the next call is soon enough.'

const pdf = async (who: Actor = call.chair): Promise<Uint8Array> => {
  const file = await readReportFile(call.as(who), {
    ...{ callSlug: call.callSlug, panelId: call.panelId, file: 'report.pdf' },
    asOffice: who === call.office,
  })
  return 'pdf' in file ? file.pdf : new Uint8Array()
}
const text = async (who?: Actor) => pdfText(await pdf(who)).replace(/\s+/g, ' ')
const csv = async (who: Actor = call.chair) => {
  const file = await readReportFile(call.as(who), {
    ...{ callSlug: call.callSlug, panelId: call.panelId, file: 'report.csv' },
    asOffice: who === call.office,
  })
  return 'csv' in file ? file.csv : ''
}
const key = async () => {
  const { list } = await readRanking(call.as(call.chair), { callSlug: call.callSlug })
  return { panelId: call.panelId, rankingId: list?.id ?? 0, version: list?.version ?? 0 }
}
const freeze = async () => freezeRanking(call.as(call.chair), await key())

beforeEach(async () => {
  call = await makePanelCall(db(), [40, 30, 20, 10])
  p = call.proposals
  const marks = [
    [18, 19, 17],
    [15, 16, 15],
    [12, 14, 13],
    [9, 8, 11],
  ]
  for (const [index, row] of marks.entries())
    for (const [seat, half] of row.entries())
      await call.review(p[index] as PanelProposalMade, call.reviewers[seat] as Actor, half)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
})

/** What happens at the meeting: presence, a proposal discussed, one moved, one given time under a condition. */
async function meet() {
  for (const who of [call.chair, call.deputy, ...call.reviewers])
    await setPresence(call.as(call.chair), {
      ...{ panelId: call.panelId, personId: who.personId, isPresent: true },
    })
  await discussNow(call.as(call.chair), { panelId: call.panelId, proposalId: p[1]?.id ?? 0 })
  await discussNow(call.as(call.chair), { panelId: call.panelId, proposalId: null })
  await moveInRanking(call.as(call.chair), { ...(await key()), proposalId: p[2]?.id ?? 0, place: 2, reason })
  await freeze()
  await saveAward(call.as(call.chair), {
    ...{ panelId: call.panelId, proposalId: p[0]?.id ?? 0, version: 0 },
    lines: [
      {
        ...{ instrumentId: call.instrumentId, hours: 30 * 3600, isReserve: false },
        ...{ service: 'queue', evenings: [], conditions: 'dark time, seeing below 0.8 arcsec' },
      },
    ],
  })
}

describe('the report of a panel', () => {
  it('is refused before the ranking is frozen', async () => {
    await expect(pdf()).rejects.toMatchObject({
      kind: 'closed',
      message: 'Freeze the ranking first: the report rests on it.',
    })
  })

  it('says who met, how it was scored, what was ranked, changed and recommended', async () => {
    await meet()
    const words = await text()
    for (const part of [
      `Report of the panel, call ${call.callNumber}`,
      'Members needed to decide 3',
      'Noted as present 5 of 5',
      call.deputy.name,
      '; one was discussed.',
      'Science 50 %',
      'Version 1, frozen',
      reason,
      'dark time, seeing',
      'Intraclass correlation of one review',
      'Krippendorff’s alpha',
      'page 1 of',
    ])
      expect(words).toContain(part)
    for (const { reviewNumber } of p) expect(words).toContain(reviewNumber)
    expect(words).toMatch(/Outcome 1 \S+ Question 1 9\.00/)
  })

  it('keeps small counts back', async () => {
    await meet()
    expect(await text()).toMatch(/Regular (kept back ?)+/)
    expect(await text()).not.toMatch(/Regular \d+ \d+ \d+/)
  })

  it('names nobody who asks, and no reviewer beside a score', async () => {
    await meet()
    const words = await text()
    for (const proposal of p) {
      expect(words).not.toContain(proposal.reference)
      expect(words).not.toContain(proposal.pi.name)
    }
    expect(words).not.toMatch(/reviewer \d/i)
  })

  it('has bookmarks, its fonts and no trace of who made it', async () => {
    await meet()
    const bytes = await pdf()
    const info = pdfInfo(bytes)
    expect(info).toMatch(/Title:\s+Report of the panel/)
    expect(info).not.toMatch(/Author/)
    expect(Number(/Pages:\s+(\d+)/.exec(info)?.[1])).toBeGreaterThan(1)
    const document = await PDFDocument.load(bytes, { updateMetadata: false })
    const outline = document.context.lookup(document.catalog.get(PDFName.of('Outlines')), PDFDict)
    const titles: string[] = []
    let item = outline.lookupMaybe(PDFName.of('First'), PDFDict)
    while (item) {
      titles.push(item.lookup(PDFName.of('Title'), PDFString, PDFHexString).decodeText())
      item = item.lookupMaybe(PDFName.of('Next'), PDFDict)
    }
    expect(titles).toEqual([
      ...['Members and meeting', 'Conflicts of interest', 'How it was scored', 'The ranking'],
      ...['The grey zone', 'Changes by hand', 'Recommended awards', 'Nights', 'Statistics', 'Agreement'],
    ])
  })

  it('gives the ranked table as CSV beside it', async () => {
    await meet()
    const rows = csvRows(await csv())
    expect(rows).toHaveLength(4)
    expect(rows[0]).toMatchObject({
      ...{ Rank: '1', 'Review number': p[0]?.reviewNumber, 'Raw mean': '9', 'Given (h)': '30' },
      ...{ Outcome: 'awarded', Conditions: 'dark time, seeing below 0.8 arcsec' },
    })
    expect(rows[1]?.['Changes by hand']).toBe(`up: ${reason}`)
  })
})

describe('who has an interest', () => {
  beforeEach(async () => {
    await db()('conflicts').insert({
      person_id: call.chair.personId,
      proposal_id: p[1]?.id ?? 0,
      kind: 'other',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    await db()('proposals')
      .where({ id: p[1]?.id ?? 0 })
      .update({ title: 'The secret one' })
    await db().raw(
      `UPDATE proposal_versions SET snapshot = JSON_SET(snapshot, '$.contents.title', 'The secret one') WHERE proposal_id = ?`,
      [p[1]?.id ?? 0],
    )
    await freeze()
  })

  it('finds nothing of the proposal in either file; deputy and office do', async () => {
    const number = p[1]?.reviewNumber ?? ''
    for (const words of [await text(), await csv()]) {
      expect(words).not.toContain(number)
      expect(words).not.toContain('The secret one')
    }
    expect(await text()).toContain('of 3.')
    for (const who of [call.deputy, call.office]) {
      expect(await text(who)).toContain(number)
      expect(await text(who)).toContain('The secret one')
      expect(await csv(who)).toContain(number)
    }
  })

  it('is counted among the conflicts where another reads it, and not where they read it themselves', async () => {
    expect(await text(call.deputy)).toMatch(/Proposals concerned 1 Declared by the member 1/)
    expect(await text()).toMatch(/Proposals concerned 0 Declared by the member 0/)
  })
})

it('is there for no one else', async () => {
  await freeze()
  for (const who of [call.reviewers[0], call.scientist, call.stranger, p[0]?.pi as Actor]) {
    await expect(pdf(who)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(
      readReportFile(call.as(who), {
        ...{ callSlug: call.callSlug, panelId: call.panelId, file: 'report.pdf', asOffice: true },
      }),
    ).rejects.toMatchObject({ kind: 'forbidden' })
  }
  await expect(
    readReportFile(call.as(call.office), {
      ...{ callSlug: call.callSlug, panelId: 999_999, file: 'report.pdf', asOffice: true },
    }),
  ).rejects.toMatchObject({ kind: 'not-found' })
})

it('of a call of several panels says how they share the time', async () => {
  const two = await makeTwoPanels(db(), { first: [30, 20], second: [30] })
  await two.rank(two.panelId)
  await two.rank(two.secondId)
  const file = await readReportFile(two.as(two.chair), {
    ...{ callSlug: two.callSlug, file: 'report.pdf', asOffice: false },
  })
  const words = 'pdf' in file ? pdfText(file.pdf).replace(/\s+/g, ' ') : ''
  expect(words).toContain('Between panels')
  expect(words).toContain('68.8 h for 50.0 h asked')
})
