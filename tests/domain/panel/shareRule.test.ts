import { describe, expect, it } from 'vitest'
import { whyNotTogether } from '@/lib/domain/sharing/rules'
import { shareRuleSchema } from '@/lib/domain/sharing/schema'

// Seen to fail with percents that need not add up, and with a panel without proposals waited for.

describe('what is typed of a rule', () => {
  const parse = (percents: string[], given = 'fixed') =>
    shareRuleSchema.safeParse({
      ...{ callId: 1, rule: given, reason: 'Agreed between chairs and office.' },
      percents: percents.map((percent, index) => ({ panelId: index + 1, percent })),
    })

  it('keeps whole percents that add up to 100, and forgets them where they are not asked', () => {
    expect(parse(['60', ' 40 ']).data?.percents).toEqual([
      { panelId: 1, percent: 60 },
      { panelId: 2, percent: 40 },
    ])
    expect(parse(['60', 'x'], 'hours').data?.percents).toEqual([])
  })

  it.each([
    [['60', '30'], 'The percents add up to 90; they must add up to 100.'],
    [['60.5', '39.5'], 'Give a whole percent, 0 to 100.'],
    [['101', '0'], 'At most 100 percent.'],
    [['-1', '100'], 'Give a whole percent, 0 to 100.'],
    [['', '100'], 'Give a whole percent, 0 to 100.'],
  ])('refuses %j: %s', (percents, sentence) => {
    expect(parse(percents).error?.issues.map(({ message }) => message)).toContain(sentence)
  })

  it('refuses a rule of another name, and one without a reason', () => {
    expect(parse([], 'by-merit').success).toBe(false)
    expect(shareRuleSchema.safeParse({ callId: 1, rule: 'hours', percents: [], reason: ' ' }).success).toBe(
      false,
    )
  })
})

describe('bringing lists together', () => {
  const panel = (name: string, proposals: number, list: 'none' | 'open' | 'frozen') => ({
    name,
    proposals,
    list,
  })

  it('does not wait for a panel with no proposals', () => {
    const panels = [panel('Near', 3, 'frozen'), panel('Far', 0, 'none'), panel('Between', 2, 'frozen')]
    expect(whyNotTogether('ranking', panels)).toBeNull()
  })

  it.each([
    ['ranking', [panel('Near', 3, 'frozen')], 'This call has one panel: its own list is the order.'],
    [
      'ranking',
      [panel('Near', 3, 'open'), panel('Far', 1, 'none')],
      'Near and Far have no frozen ranking yet: lists are brought together once every panel has frozen its own.',
    ],
    ['ranking', [panel('Near', 0, 'none'), panel('Far', 0, 'none')], 'No panel of this call has a proposal.'],
    [
      'decided',
      [panel('Near', 1, 'frozen'), panel('Far', 1, 'frozen')],
      'The decisions of this call are made known: the order stands.',
    ],
  ] as const)('in %s with %j: %s', (phase, panels, sentence) => {
    expect(whyNotTogether(phase, panels)).toBe(sentence)
  })
})
