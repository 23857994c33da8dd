import { beforeEach, describe, expect, it } from 'vitest'
import { readSample } from '@/lib/domain/outbox/readSample'
import { letterSamples } from '@/lib/domain/outbox/samples/samples'
import { makeBilled, type Billed } from '../../support/billed'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'

const db = useRolledBackDatabase()
let billed: Billed
const read = (template: string) =>
  readSample(billed.as(billed.scenario.office), { template, reference: billed.scenario.reference })

beforeEach(async () => {
  billed = await makeBilled(db())
})

// Seen to fail: with letters of nothing built all the same.
describe('a letter tried on a real proposal', () => {
  it('tells its facts, in text and HTML, and sends nothing', async () => {
    const before = await db()('outbox').count({ n: '*' })
    const { letter } = await read('proposal-sent')
    expect(letter?.subject).toContain(billed.scenario.reference)
    expect(letter?.text).toMatch(/^Dear Maren Sollvik,/)
    expect(letter?.html).toContain('The fee of')
    expect(await db()('outbox').count({ n: '*' })).toEqual(before)
  })

  it.each(['decision', 'fee-receipt', 'staff-question', 'waiver-decided'])(
    'is not made up where there is nothing to tell: %s',
    async (template) => {
      expect((await read(template)).letter).toBeNull()
    },
  )

  it('can be chosen for every letter, told or not', async () => {
    for (const sample of letterSamples) {
      const { letter } = await read(sample.template)
      expect({ [sample.template]: letter === null || letter.text.startsWith('Dear ') }).toEqual({
        [sample.template]: true,
      })
    }
  })

  it('is the office’s to look at', async () => {
    const reading = readSample(billed.as(billed.scenario.chair), {})
    expect((await refused(reading)).kind).toBe('forbidden')
  })
})
