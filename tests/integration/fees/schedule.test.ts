import { beforeEach, describe, expect, it } from 'vitest'
import { feeScheduleSchema } from '@/lib/domain/calls/feeScheduleSchema'
import { saveFeeSchedule } from '@/lib/domain/calls/saveFeeSchedule'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { useRolledBackDatabase } from '../../support/database'
import { testContext } from '../../support/context'
import { memoryStore } from '../../support/memoryStore'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
const storage = memoryStore()
let scenario: Scenario
const ctx = (who: 'pi' | 'office') => testContext(db(), scenario[who], { storage })
const call = async () => {
  const row = await db()('calls').where({ id: scenario.callId }).first()
  if (!row) throw new Error('the call is gone')
  return row
}
const kinds = () => db()('call_kinds').where({ call_id: scenario.callId }).orderBy('id')

async function schedule(over: { currency?: string; member?: string; late?: string } = {}) {
  const { slug, version } = await call()
  return {
    slug,
    version,
    currency: over.currency ?? 'EUR',
    kinds: (await kinds()).map(({ id }) => ({
      kindId: id,
      member: over.member ?? '60.00',
      partner: '90',
      other: '120',
      late: over.late ?? '30',
    })),
  }
}
const save = async (over: Parameters<typeof schedule>[0] = {}) =>
  saveFeeSchedule(ctx('office'), feeScheduleSchema.parse(await schedule(over)))
const led = async (affiliation_class: 'member' | 'partner' | 'other') => {
  const [id] = await db()('institutes').insert({ name: `Institute ${scenario.tag}`, affiliation_class })
  await db()('people')
    .where({ id: scenario.pi.personId })
    .update({ institute_id: Number(id) })
}
const fee = () => db()('fees').where({ proposal_id: scenario.proposalId }).first()

beforeEach(async () => {
  scenario = await makeScenario(db(), { storage })
})

// Seen to fail with everybody billed as other institutes are.
describe('the fees of a call', () => {
  it.each([
    ['member', 6_000],
    ['partner', 9_000],
    ['other', 12_000],
  ] as const)('bill whoever is led from a %s institute by the schedule', async (name, amount_minor) => {
    await save()
    await led(name)
    const before = await readProposal(ctx('pi'), scenario.reference)
    expect(before.feeToCome).toMatchObject({ amountMinor: amount_minor, currency: 'EUR' })
    await sendIn(ctx('pi'), scenario.reference)
    expect(await fee()).toMatchObject({ amount_minor, affiliation_class: name, late_minor: 0 })
  })

  it('bill nothing where it is free, and speak of nothing', async () => {
    await save({ member: '0' })
    await led('member')
    expect((await readProposal(ctx('pi'), scenario.reference)).feeToCome).toBeNull()
    await sendIn(ctx('pi'), scenario.reference)
    expect(await fee()).toBeUndefined()
  })

  it('bill more for what is sent after the deadline, under an extension', async () => {
    await save()
    const past = new Date(Date.now() - 3_600_000)
    await db()('calls').where({ id: scenario.callId }).update({ closes_at: past })
    await db()('call_kinds').where({ call_id: scenario.callId }).update({ closes_at: null })
    await db()('proposals')
      .where({ id: scenario.proposalId })
      .update({ closes_at: new Date(Date.now() + 3_600_000) })
    await sendIn(ctx('pi'), scenario.reference)
    expect(await fee()).toMatchObject({ amount_minor: 15_000, late_minor: 3_000 })
  })

  it('keep the price of what was billed', async () => {
    await save()
    await sendIn(ctx('pi'), scenario.reference)
    await save({ member: '1' })
    expect(await fee()).toMatchObject({ amount_minor: 12_000 })
    await expect(save({ currency: 'USD' })).rejects.toThrow('billed in EUR already')
    expect((await call()).currency).toBe('EUR')
  })

  it.each([
    [{ member: '-1' }, 'never negative'],
    [{ member: '1.005' }, 'two decimals'],
    [{ member: 'USD 60' }, 'in EUR, not in USD'],
    [{ late: 'much' }, 'in figures'],
    [{ currency: 'EURO' }, 'three letters'],
    [{ currency: 'XQX' }, 'three letters'],
    [{ currency: '' }, 'currency of the call first'],
    [{ currency: 'JPY', member: '60.5' }, 'no smaller unit'],
  ])('refuse %o in words', async (over, words) => {
    const result = feeScheduleSchema.safeParse(await schedule(over))
    expect(JSON.stringify(result.error?.issues)).toContain(words)
  })

  it('are the office’s, and stand once the call has closed', async () => {
    const input = feeScheduleSchema.parse(await schedule())
    await expect(saveFeeSchedule(ctx('pi'), input)).rejects.toMatchObject({ kind: 'forbidden' })
    await db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: new Date(Date.now() - 1000) })
    await expect(save()).rejects.toThrow('has closed')
  })

  it('are not overwritten by whoever read them before somebody else', async () => {
    const stale = feeScheduleSchema.parse(await schedule())
    await save()
    await expect(saveFeeSchedule(ctx('office'), stale)).rejects.toMatchObject({ kind: 'stale' })
  })
})
