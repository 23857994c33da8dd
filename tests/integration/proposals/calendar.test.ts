import { beforeEach, describe, expect, it } from 'vitest'
import { readAwardedNights } from '@/lib/domain/decisions/readAwardedNights'
import { calendarOf } from '@/lib/domain/submission/calendarOf'
import { readSent } from '@/lib/domain/submission/readSent'
import { award } from '../../support/award'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
let scenario: Scenario
let storage: ReturnType<typeof memoryStore>

const ctx = () => testContext(db(), scenario.pi, { storage })
const given = (releasedAt?: Date | null) =>
  award(db(), {
    proposalId: scenario.proposalId,
    instrumentId: scenario.instrumentId,
    seconds: 5400,
    ...(releasedAt === undefined ? {} : { releasedAt }),
  })

async function calendar(): Promise<string> {
  const sent = await readSent(ctx(), scenario.reference)
  const awarded = await readAwardedNights(ctx(), sent.contents)
  return calendarOf({ sent, email: scenario.pi.email, origin: 'https://noctuary.example', awarded })
}

/** Lines with their continuations joined again, as RFC 5545 section 3.1 has it. */
const unfolded = (text: string) => text.replaceAll('\r\n ', '').split('\r\n')
const events = (text: string) =>
  unfolded(text)
    .join('\n')
    .split('BEGIN:VEVENT')
    .slice(1)
    .map((event) => new Map(event.split('\n').map((line) => [/^[A-Z-]+/.exec(line)?.[0] ?? '', line])))

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
  await db()('proposals')
    .where({ id: scenario.proposalId })
    .update({ title: `Schärfe ≤ 0.3″: ${'lange Worte, '.repeat(12)}Ende` })
  await sendIn(ctx(), scenario.reference)
})

// RFC 5545 sections 3.1, 3.6.1, 3.8.4.7 and 3.8.7.2. tests/reference/nights_calendar.py reads the file with another library.
// Seen to fail: with lines folded at 75 characters instead of octets, with LF alone, and before the release was asked for.
describe('the calendar of a proposal', () => {
  it('has lines of at most 75 octets that end in CRLF', async () => {
    await given()
    const text = await calendar()
    expect(text.endsWith('END:VCALENDAR\r\n')).toBe(true)
    const lines = text.split('\r\n')
    expect(lines.filter((line) => /[\r\n]/.test(line))).toEqual([])
    expect(Math.max(...lines.map((line) => Buffer.byteLength(line)))).toBeLessThanOrEqual(75)
    expect(lines.some((line) => line.startsWith(' '))).toBe(true)
    expect(unfolded(text).join('\n')).toContain('Schärfe ≤ 0.3″')
  })

  it('gives every event an id of its own that stays, a stamp and UTC times', async () => {
    await given()
    const [first, second] = [events(await calendar()), events(await calendar())]
    const ids = first.map((event) => event.get('UID'))
    expect(new Set(ids).size).toBe(ids.length)
    expect(second.map((event) => event.get('UID'))).toEqual(ids)
    for (const event of first) {
      expect(event.get('DTSTAMP')).toMatch(/^DTSTAMP:\d{8}T\d{6}Z$/)
      expect(event.get('DTSTART')).toMatch(/^DTSTART(:\d{8}T\d{6}Z|;VALUE=DATE:\d{8})$/)
    }
  })

  it('holds the nights of the award, none of them promised', async () => {
    await given()
    const nights = events(await calendar()).filter((event) => event.get('UID')?.includes('-night-'))
    expect(nights).toHaveLength(31)
    expect(nights[0]?.get('STATUS')).toBe('STATUS:TENTATIVE')
    expect(nights[0]?.get('UID')).toContain(`night-${scenario.telescopeId}-2027-07-01-0@noctuary.example`)
    expect(nights[0]?.get('DESCRIPTION')).toContain('1.5')
  })

  it('holds no night before the decision is made known', async () => {
    await given(null)
    await db()('proposals').where({ id: scenario.proposalId }).update({ state: 'awarded' })
    expect(events(await calendar()).filter((event) => event.get('UID')?.includes('-night-'))).toEqual([])
  })
})
