import { describe, expect, it } from 'vitest'
import { proposalVerdict, type Verdict, type VerdictGroup } from '../../../lib/science/feasibility'
import { sayHours, sayNumber, sayPercent } from '../../../lib/science/feasibility/saying'

const good: Verdict = 'feasible'
const fair: Verdict = 'marginal'
const bad: Verdict = 'not-feasible'

function group(change: Partial<VerdictGroup>): VerdictGroup {
  return { id: 'a', need: 'required', rule: 'all', verdicts: [good], ...change }
}

describe('verdict of a proposal', () => {
  it.each<[string, VerdictGroup[], Verdict | null]>([
    ['nothing to judge', [], null],
    ['an empty group', [group({ verdicts: [] })], null],
    ['all good', [group({ verdicts: [good, good] })], good],
    ['one bad of all', [group({ verdicts: [good, bad] })], bad],
    [
      'one bad of sixty, where fifty are enough',
      [group({ rule: { atLeast: 50 }, verdicts: [...Array<Verdict>(59).fill(good), bad] })],
      good,
    ],
    [
      'two of three, the second marginal',
      [group({ rule: { atLeast: 2 }, verdicts: [bad, fair, good] })],
      fair,
    ],
    ['more wanted than there are', [group({ rule: { atLeast: 3 }, verdicts: [good, good] })], bad],
    ['a bad optional target', [group({}), group({ id: 'b', need: 'optional', verdicts: [bad] })], good],
    ['a bad backup', [group({}), group({ id: 'b', need: 'backup', verdicts: [bad] })], good],
    [
      'only optional: the best counts',
      [group({ need: 'optional', verdicts: [bad] }), group({ need: 'optional', verdicts: [fair] })],
      fair,
    ],
    ['only backups', [group({ need: 'backup' })], null],
    ['the worst required group', [group({}), group({ verdicts: [fair] })], fair],
  ])('%s', (_, groups, verdict) => {
    expect(proposalVerdict(groups).verdict).toBe(verdict)
  })

  it('counts each group', () => {
    const { groups } = proposalVerdict([group({ verdicts: [good, fair, fair, bad] })])
    expect(groups).toEqual([
      { id: 'a', verdict: bad, counts: { feasible: 1, marginal: 2, 'not-feasible': 1 } },
    ])
  })
})

describe('numbers as they are said', () => {
  it('true minus, thousands commas, units after a gap that does not break', () => {
    expect(sayNumber(-1234567.891, 2)).toBe('−1,234,567.89')
    expect(sayNumber(-0.001, 2)).toBe('0.00')
    expect(sayNumber(999.96, 1)).toBe('1,000.0')
    expect(sayHours(3600 * 976.6)).toBe('976.6\u00a0h')
    expect(sayPercent(0.0123, 1)).toBe('1.2\u00a0%')
  })
})
