import fc from 'fast-check'
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
    ['a target of which nothing is asked yet: marginal at best', [group({ verdicts: [good, null] })], fair],
    [
      'enough others that are asked for',
      [group({ rule: { atLeast: 2 }, verdicts: [good, null, good] })],
      good,
    ],
    ['the worst required group', [group({}), group({ verdicts: [fair] })], fair],
  ])('%s', (_, groups, verdict) => {
    expect(proposalVerdict(groups).verdict).toBe(verdict)
  })

  it('counts each group', () => {
    const { groups } = proposalVerdict([group({ verdicts: [good, fair, fair, bad] })])
    expect(groups).toEqual([
      { id: 'a', verdict: bad, counts: { feasible: 1, marginal: 2, 'not-feasible': 1, unasked: 0 } },
    ])
  })
})

// Seen to fail: with the n-th worst in place of the n-th best, with backups among the required, and with unasked as bad.
describe('properties of the verdict', () => {
  const rank = { feasible: 0, marginal: 1, 'not-feasible': 2 } as const
  const verdicts = fc.array(fc.constantFrom<Verdict | null>(good, fair, bad, null), {
    minLength: 1,
    maxLength: 12,
  })
  const anyGroup = fc.record({
    id: fc.constant('g'),
    need: fc.constantFrom<VerdictGroup['need']>('required', 'optional', 'backup'),
    rule: fc.oneof(fc.constant('all' as const), fc.record({ atLeast: fc.integer({ min: 1, max: 14 }) })),
    verdicts,
  })
  const proposals = fc.array(anyGroup, { minLength: 1, maxLength: 5 })
  const verdictOf = (groups: readonly VerdictGroup[]) => proposalVerdict(groups).verdict

  it('no target made better makes it worse', () => {
    fc.assert(
      fc.property(proposals, fc.nat(), fc.nat(), (groups, at, which) => {
        const better = groups.map((one, index) =>
          index === at % groups.length
            ? { ...one, verdicts: one.verdicts.map((v, n) => (n === which % one.verdicts.length ? good : v)) }
            : one,
        )
        const [before, after] = [verdictOf(groups), verdictOf(better)]
        // Nothing to judge stays nothing to judge.
        expect(after === null).toBe(before === null)
        expect(rank[after ?? good]).toBeLessThanOrEqual(rank[before ?? bad])
      }),
    )
  })

  it('all of n is at least n of n', () => {
    fc.assert(
      fc.property(verdicts, (of) => {
        const all = verdictOf([group({ rule: 'all', verdicts: of })])
        expect(verdictOf([group({ rule: { atLeast: of.length }, verdicts: of })])).toBe(all)
      }),
    )
  })

  it('to want fewer never makes it worse', () => {
    fc.assert(
      fc.property(verdicts, fc.integer({ min: 1, max: 11 }), (of, atLeast) => {
        const want = (n: number) => verdictOf([group({ rule: { atLeast: n }, verdicts: of })]) ?? bad
        expect(rank[want(atLeast)]).toBeLessThanOrEqual(rank[want(atLeast + 1)])
      }),
    )
  })

  it('a backup changes nothing', () => {
    fc.assert(
      fc.property(proposals, verdicts, (groups, of) => {
        const withBackup = [...groups, group({ id: 'spare', need: 'backup', verdicts: of })]
        expect(verdictOf(withBackup)).toBe(verdictOf(groups))
      }),
    )
  })

  it('neither the order of targets nor that of groups matters', () => {
    fc.assert(
      fc.property(proposals, (groups) => {
        const turned = [...groups].reverse().map((one) => ({ ...one, verdicts: [...one.verdicts].reverse() }))
        expect(verdictOf(turned)).toBe(verdictOf(groups))
      }),
    )
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
