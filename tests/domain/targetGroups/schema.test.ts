import { describe, expect, it } from 'vitest'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { groupSchema, type GroupRow } from '@/lib/domain/targetGroups/schema'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import { emptyTargetRow } from '@/lib/domain/targets/targetRow'

const row = (over: Partial<GroupRow> = {}): GroupRow => ({
  ...{ name: 'Five clusters', rule: 'at-least', atLeast: '3', hoursFor: 'at-least' },
  targetIds: ['1', '2', '3', '4', '5'],
  ...over,
})
const messages = (over: Partial<GroupRow>) => {
  const result = groupSchema.safeParse(row(over))
  return result.success ? {} : fieldErrorsOf(result.error)
}

describe('a group as it is typed', () => {
  it('keeps the number and the hours only where the rule asks for them', () => {
    expect(groupSchema.parse(row({ name: '  Five   clusters ' }))).toEqual({
      ...{ name: 'Five clusters', rule: 'at-least', atLeast: 3, hoursFor: 'at-least' },
      targetIds: [1, 2, 3, 4, 5],
    })
    for (const rule of ['all', 'backup'] as const)
      expect(groupSchema.parse(row({ rule, atLeast: 'x' }))).toMatchObject({ atLeast: null, hoursFor: 'all' })
  })

  it.each<[Partial<GroupRow>, Record<string, string>]>([
    [{ atLeast: '5' }, {}],
    [{ atLeast: '0' }, { atLeast: 'At least one of them must be done.' }],
    [{ atLeast: '-2' }, { atLeast: 'At least one of them must be done.' }],
    [{ atLeast: '6' }, { atLeast: 'Only five targets are in it, so no more than five can be wanted.' }],
    [
      { atLeast: '2', targetIds: ['7', '7'] },
      { atLeast: 'Only one target is in it, so no more than one can be wanted.' },
    ],
    [{ atLeast: '2.5' }, { atLeast: 'Targets are counted in whole numbers.' }],
    [{ atLeast: '' }, { atLeast: 'Say how many of them must be done, in figures.' }],
    [{ atLeast: 'three' }, { atLeast: 'Say how many of them must be done, in figures.' }],
    [{ name: '  ' }, { name: 'Give the group a name.' }],
    [{ name: 'x'.repeat(121) }, { name: 'A name has at most 120 characters.' }],
    [{ rule: 'all', targetIds: [] }, { targetIds: 'Put at least one target into it.' }],
  ])('%j', (over, expected) => {
    expect(messages(over)).toEqual(expected)
  })
})

describe('what is awaited, as it is typed', () => {
  const awaited = { event: 'Kilonova', trigger: 'A burst', reaction: '1.5', triggers: '3' }
  const errors = (over: Partial<TargetRow>) => {
    const result = targetRowSchema.safeParse({ ...emptyTargetRow, name: 'Next', ...over })
    return result.success ? {} : fieldErrorsOf(result.error)
  }

  it('is all four or nothing', () => {
    const kept = targetRowSchema.parse({ ...emptyTargetRow, name: 'Next', ...awaited })
    expect(kept.opportunity).toEqual({
      ...{ event: 'Kilonova', trigger: 'A burst', reactionSeconds: 5400, triggers: 3 },
    })
    expect(targetRowSchema.parse({ ...emptyTargetRow, name: 'Next' }).opportunity).toBeNull()
  })

  it.each<[Partial<TargetRow>, Record<string, string>]>([
    [{ ...awaited, event: '' }, { event: 'Say what class of event is awaited.' }],
    [{ ...awaited, trigger: ' ' }, { trigger: 'Say what must be seen before it is observed.' }],
    [
      { ...awaited, reaction: '' },
      { reaction: 'Say within how many hours of the trigger it must be observed.' },
    ],
    [{ ...awaited, reaction: '0' }, { reaction: 'A reaction time lies between 0.10 and 8,760.' }],
    [{ ...awaited, triggers: '' }, { triggers: 'Say how many triggers you ask for.' }],
    [{ ...awaited, triggers: '1.5' }, { triggers: 'Triggers are counted in whole numbers.' }],
    [{ ...awaited, triggers: '0' }, { triggers: 'A number of triggers lies between 1 and 100.' }],
  ])('%j', (over, expected) => {
    expect(errors(over)).toEqual(expected)
  })
})
