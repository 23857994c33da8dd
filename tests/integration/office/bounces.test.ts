import { beforeEach, describe, expect, it, vi } from 'vitest'
import { takeReport } from '@/lib/domain/bounces/takeReport'
import type { Context } from '@/lib/domain/context'
import { queueLetter } from '@/lib/domain/outbox/queueLetter'
import { retryLetter } from '@/lib/domain/outbox/retryLetter'
import { passwordChanged } from '@/lib/domain/outbox/letters/passwordChanged'
import { isReportSecret } from '@/lib/services/mail/isReportSecret'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { reportText, type ReportWish } from '../../support/reportText'
import { makeScenario, type Scenario } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario
let letterId: number
let name: string
const office = () => testContext(db(), scenario.office)
const outside = (): Context => ({ ...office(), actor: null })
const letter = () => db()('outbox').where({ id: letterId }).first()
const person = () => db()('people').where({ id: scenario.pi.personId }).first()
const take = async (wish: ReportWish = {}) =>
  (await takeReport(outside(), reportText({ envelopeId: null, messageId: `<${name}>`, ...wish }))).taken

beforeEach(async () => {
  scenario = await makeScenario(db())
  const to = { personId: scenario.pi.personId, email: scenario.pi.email, name: scenario.pi.name }
  await queueLetter(office(), to, passwordChanged(scenario.pi, 'http://x.example'), `test:${scenario.tag}`)
  await db()('outbox').where({ to_email: scenario.pi.email }).update({ state: 'sent', sent_at: new Date() })
  const row = await db()('outbox').where({ to_email: scenario.pi.email }).first()
  letterId = row?.id ?? 0
  name = row?.message_id.replace(/[<>]/g, '') ?? ''
})

// Seen to fail: with delays taken for refusals, with a report taken twice, and with a letter found by its reader alone.
describe('a letter that comes back later', () => {
  it('is found by its Message-ID, and its address is marked as at sending', async () => {
    expect(await take()).toBe('bounced')
    expect(await letter()).toMatchObject({
      state: 'bounced',
      last_error: '5.1.1: 550 5.1.1 No such mailbox here',
    })
    expect((await person())?.address_failed_why).toContain('No such mailbox')
    expect((await person())?.address_failed_at).toBeInstanceOf(Date)
  })

  it('is found by its envelope name, where the letter itself was not given back', async () => {
    expect(await take({ messageId: null, envelopeId: name })).toBe('bounced')
    expect((await letter())?.state).toBe('bounced')
  })

  it('is only noted while it may still arrive, and set aside when the servers gave up', async () => {
    expect(await take({ action: 'delayed', status: '4.4.1', diagnostic: 'smtp; 451 busy' })).toBe('noted')
    expect(await letter()).toMatchObject({ state: 'sent', last_error: '4.4.1: 451 busy' })
    expect(await take({ action: 'failed', status: '4.4.7', diagnostic: 'smtp; 451 too long' })).toBe('parked')
    expect((await letter())?.state).toBe('parked')
    expect((await person())?.address_failed_at).toBeNull()
  })

  it('is heard once: a second report changes nothing, nor does one about a try before', async () => {
    await take()
    expect(await take({ diagnostic: 'smtp; 550 other words' })).toBe('known')
    expect((await letter())?.last_error).toContain('No such mailbox')
    await retryLetter(office(), { letterId })
    expect(await take()).toBe('known')
    expect((await letter())?.state).toBe('queued')
  })

  it('is none of ours when made up, whoever it names', async () => {
    const before = await letter()
    const madeUp = { messageId: '<made-up@quillonridge.example>', recipient: scenario.pi.email }
    expect(await take(madeUp)).toBe('unknown')
    expect(await take({ messageId: null, recipient: scenario.pi.email })).toBe('unknown')
    expect(await take({ action: 'delivered', status: '2.0.0' })).toBe('delivered')
    expect((await takeReport(outside(), 'Subject: hello\r\n\r\nThank you.')).taken).toBe('no report')
    expect(await letter()).toEqual(before)
    expect((await person())?.address_failed_at).toBeNull()
  })
})

it('has one secret, and none is good where none is set', async () => {
  const secret = 'k'.repeat(40)
  vi.resetModules()
  vi.stubEnv('MAIL_REPORT_SECRET', secret)
  const { isReportSecret: set } = await import('@/lib/services/mail/isReportSecret')
  expect([set(secret), set(`${secret}k`), set(''), set(secret.slice(1))]).toEqual([true, false, false, false])
  vi.unstubAllEnvs()
  expect(isReportSecret('')).toBe(false)
  expect(isReportSecret('undefined')).toBe(false)
})
