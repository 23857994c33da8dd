import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { NuqsTestingAdapter } from 'nuqs/adapters/testing'
import { expect, it, vi } from 'vitest'
import { TargetsEditor } from '@/components/targets/TargetsEditor'
import type { TargetActions } from '@/components/targets/targetActions'
import { computeProposal } from '@/lib/domain/observations/rules'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { contents, observation, target } from '../support/contents'

vi.setConfig({ testTimeout: 20_000 })

const group = { id: 5, name: 'Pair', rule: 'all', atLeast: null, hoursFor: 'all', version: 2 } as const
const three = () =>
  contents({
    groups: [{ ...group }],
    targets: [
      target({ id: 11, name: 'A', group: 'Pair' }),
      target({ id: 12, position: 2, name: 'B', group: 'Pair', decDeg: -20 }),
      target({ id: 13, position: 3, name: 'C', decDeg: -40, need: 'backup' }),
    ],
    observations: [11, 12, 13].map((id) => observation({ id: id + 10, position: id, targetId: id })),
  })

function show(
  over: Partial<TargetActions> = {},
  given: ProposalContents = three(),
  readOnly: string | null = null,
) {
  const no = async () => ({ ok: false as const, kind: 'invalid' as const, message: 'no', fieldErrors: {} })
  const saveGroup = vi.fn<TargetActions['saveGroup']>(async () => ({
    ok: true,
    data: { ...group, version: 3, moved: [] },
  }))
  const save = vi.fn<TargetActions['save']>(async () => ({ ok: true, data: target({ version: 2 }) }))
  const others = {
    add: no,
    change: no,
    remove: no,
    restore: no,
    reorder: no,
    importRows: no,
    ask: no,
    removeGroup: no,
  }
  render(
    <NuqsTestingAdapter>
      <TargetsEditor
        contents={given}
        computation={computeProposal(given)}
        readOnly={readOnly}
        actions={{ ...others, save, saveGroup, ...over }}
      />
    </NuqsTestingAdapter>,
  )
  return { save, saveGroup }
}

/** The words that go with a field: its help and its message. */
const wordsOf = (field: HTMLElement) =>
  (field.getAttribute('aria-describedby') ?? '')
    .split(' ')
    .map((id) => document.getElementById(id)?.textContent ?? '')
    .join(' ')

const groups = () => within(screen.getByRole('region', { name: 'Groups' }))

// Seen to fail: with the form's targets not among what is sent, and with the number asked for whatever the rule.
it('says how each group stands and how its hours count', () => {
  show()
  expect(groups().getByText(/^All two wanted;/)).toBeDefined()
  expect(groups().getByText(/2\.0.h asked, for all two\./)).toBeDefined()
  expect(screen.getByText('Three targets, two in one group')).toBeDefined()
  expect(screen.getByText('not counted')).toBeDefined()
})

it('changes the rule of a group and who is in it', async () => {
  const user = userEvent.setup()
  const { saveGroup } = show()
  await user.click(groups().getByRole('button', { name: 'Change the group Pair' }))
  expect(groups().queryByLabelText('How many must be done')).toBeNull()
  await user.click(groups().getByRole('radio', { name: 'At least some of them' }))
  await user.type(groups().getByLabelText('How many must be done'), '2')
  await user.click(groups().getByRole('radio', { name: 'as many as must be done' }))
  await user.click(groups().getByRole('checkbox', { name: 'C' }))
  await user.click(groups().getByRole('button', { name: 'Save the group' }))
  expect(saveGroup).toHaveBeenCalledWith({
    ...{ reference: '4F7-K2M', id: 5, version: 2 },
    group: {
      ...{ name: 'Pair', rule: 'at-least', atLeast: '2', hoursFor: 'at-least' },
      targetIds: ['11', '12', '13'],
    },
  })
})

it('says at its field what a group lacks, and sends nothing', async () => {
  const user = userEvent.setup()
  const { saveGroup } = show()
  await user.click(groups().getByRole('button', { name: 'Make a group' }))
  await user.click(groups().getByRole('checkbox', { name: /^A/ }))
  await user.type(groups().getByLabelText('How many must be done'), '2')
  await user.click(groups().getByRole('button', { name: 'Save the group' }))
  expect(wordsOf(groups().getByLabelText('Name'))).toMatch('Give the group a name.')
  expect(wordsOf(groups().getByLabelText('How many must be done'))).toMatch(
    /Only one target is in it, so no more than one can be wanted\./,
  )
  expect(saveGroup).not.toHaveBeenCalled()
})

it('shows at its field that a name is taken', async () => {
  const user = userEvent.setup()
  const sentence = 'Another group is called that already.'
  const taken = { ok: false as const, kind: 'invalid' as const, message: sentence }
  show({ saveGroup: async () => ({ ...taken, fieldErrors: { 'group.name': sentence } }) })
  await user.click(groups().getByRole('button', { name: 'Change the group Pair' }))
  await user.click(groups().getByRole('button', { name: 'Save the group' }))
  expect(wordsOf(await groups().findByLabelText('Name'))).toMatch(sentence)
})

it('puts a target into a group, and out, at its own row', async () => {
  const user = userEvent.setup()
  const { save } = show()
  const row = (name: string) => screen.getByLabelText(`How much ${name} is needed, or its group`)
  await user.selectOptions(row('C'), 'Pair')
  expect(save).toHaveBeenLastCalledWith(
    expect.objectContaining({ id: 13, row: expect.objectContaining({ group: 'Pair' }) }),
  )
  await user.selectOptions(row('A'), 'optional')
  expect(save).toHaveBeenLastCalledWith(
    expect.objectContaining({ id: 11, row: expect.objectContaining({ group: '', need: 'optional' }) }),
  )
})

it('asks what is awaited only where the kind of proposal takes it', async () => {
  const user = userEvent.setup()
  show()
  await user.click(screen.getByRole('button', { name: 'More about A' }))
  expect(screen.queryByLabelText('Class of event')).toBeNull()
})

it('keeps what is awaited with its row, and says that nothing can be told of its nights', async () => {
  const user = userEvent.setup()
  const opportunity = { event: 'Kilonova', trigger: 'A burst', reactionSeconds: 7200, triggers: 3 }
  const awaited = target({ opportunity, raTyped: '', decTyped: '', raDeg: null, decDeg: null })
  const kind = { ...contents().kind, takesAwaited: true }
  const { save } = show({}, contents({ kind, targets: [awaited] }))
  expect(screen.getByText(/No position yet: when it is up cannot be judged/)).toBeDefined()
  expect(screen.getByText('each of 3')).toBeDefined()
  await user.click(screen.getByRole('button', { name: 'More about 3C 273' }))
  await user.clear(screen.getByLabelText('Triggers asked for'))
  await user.tab()
  expect((await screen.findAllByText(/Say how many triggers you ask for\./)).length).toBeGreaterThan(0)
  expect(save).not.toHaveBeenCalled()
  await user.type(screen.getByLabelText('Triggers asked for'), '4')
  await user.tab()
  expect(save).toHaveBeenLastCalledWith(
    expect.objectContaining({
      row: expect.objectContaining({ triggers: '4', event: 'Kilonova', reaction: '2' }),
    }),
  )
})

it('only tells when nothing can be changed', () => {
  show({}, three(), 'This proposal has been sent.')
  expect(groups().getByText(/^All two wanted;/)).toBeDefined()
  expect(groups().queryByRole('button')).toBeNull()
})
