import { beforeEach, describe, expect, it } from 'vitest'
import { askForInvoice } from '@/lib/domain/fees/askForInvoice'
import { askForWaiver } from '@/lib/domain/fees/askForWaiver'
import { remindByClock, remindOwing } from '@/lib/domain/fees/remindOwing'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'

const db = useRolledBackDatabase()
const hourMs = 3_600_000
let billed: Billed

/** The clock cannot be moved within a transaction, so the call is moved around it. */
const closesIn = (hours: number) =>
  db()('calls')
    .where({ id: billed.scenario.callId })
    .update({ closes_at: new Date(Date.now() + hours * hourMs) })
const billedAgo = (hours: number) =>
  db()('fees')
    .where({ proposal_id: billed.scenario.proposalId })
    .update({
      created_at: new Date(Date.now() - hours * hourMs),
      due_at: new Date(Date.now() + 30 * 24 * hourMs),
    })
const letters = async () =>
  (await db()('outbox').where({ template: 'fee-reminder' }).orderBy('id')).map(({ to_email }) => to_email)
const byClock = () => remindByClock({ ...billed.ctx, actor: null })

beforeEach(async () => {
  billed = await makeBilled(db())
  await billedAgo(24 * 20)
})

// Seen to fail with fees that are asked to be waived not left out.
describe('reminding whoever owes', () => {
  it('writes once at each moment, to those who lead alone', async () => {
    await closesIn(73)
    expect(await byClock()).toBe(0)
    await closesIn(71)
    expect(await byClock()).toBe(1)
    expect(await byClock()).toBe(0)
    expect(await letters()).toEqual([billed.scenario.pi.email])
    await closesIn(23)
    expect(await byClock()).toBe(1)
    await closesIn(-25)
    expect(await byClock()).toBe(1)
    await closesIn(-73)
    expect(await byClock()).toBe(1)
    expect(await byClock()).toBe(0)
    expect(await letters()).toHaveLength(4)
  })

  it('writes one letter after standing still over several moments', async () => {
    await closesIn(-100)
    expect(await byClock()).toBe(1)
    expect(await letters()).toHaveLength(1)
  })

  it('leaves those alone who wait for the office or an institute, or have settled', async () => {
    await closesIn(23)
    const { reference } = billed.scenario
    await askForWaiver(billed.ctx, { reference, reason: 'Our institute has no funds for fees.' })
    expect(await byClock()).toBe(0)
    await db()('waivers').update({ state: 'refused' })
    await askForInvoice(billed.ctx, {
      reference,
      institute: 'Sandrey School',
      address: '4 Harbour Row',
      purchaseOrder: '',
      sendTo: 'accounts@sandrey.example',
    })
    expect(await byClock()).toBe(0)
  })

  it('is pressed by the office once a day', async () => {
    const office = billed.as(billed.scenario.office)
    const slug = billed.scenario.callSlug
    expect(await remindOwing(office, { slug })).toEqual({ count: 1 })
    expect(await remindOwing(office, { slug })).toEqual({ count: 0 })
    expect(await letters()).toEqual([billed.scenario.pi.email])
    await expect(remindOwing(billed.ctx, { slug })).rejects.toMatchObject({ kind: 'not-found' })
  })
})
