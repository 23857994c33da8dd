import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { NuqsTestingAdapter } from 'nuqs/adapters/testing'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { TargetsEditor } from '@/components/targets/TargetsEditor'
import type { TargetActions } from '@/components/targets/targetActions'
import { Toaster } from '@/components/ui/Toaster'
import { computeProposal } from '@/lib/domain/observations/rules'
import { contents, observation, target } from '../support/contents'

vi.setConfig({ testTimeout: 20_000 })

const group = { id: 5, name: 'Pair', rule: 'all', atLeast: null, hoursFor: 'all', version: 2 } as const
const given = contents({
  groups: [{ ...group }],
  targets: [
    target({ id: 11, name: 'First', group: 'Pair' }),
    target({ id: 12, position: 2, name: 'Second', decDeg: -20, group: 'Pair' }),
  ],
  // A third of an hour and a second: no cell shows it whole.
  observations: [observation({ id: 21, targetId: 11, version: 4, askedSeconds: 1201 })],
})
const said = () => document.body.textContent?.replaceAll('\u00a0', ' ') ?? ''

function show() {
  const no = async () => ({ ok: false as const, kind: 'invalid' as const, message: 'No.', fieldErrors: {} })
  const ask = vi.fn<TargetActions['ask']>(async ({ asked }) => ({
    ok: true,
    data: asked.map(({ id, version, askedHours }) => ({
      ...{ id, version: version + 1 },
      askedSeconds: Math.round(Number(askedHours) * 3600),
    })),
  }))
  const saveGroup = vi.fn<TargetActions['saveGroup']>(async ({ id, version }) => ({
    ok: true,
    data: { ...group, id: id ?? 9, version: version + 1, moved: [{ id: 12, version: 7 }] },
  }))
  const removeGroup = vi.fn<TargetActions['removeGroup']>(async () => ({
    ok: true,
    data: { name: 'Pair', moved: [{ id: 12, version: 7 }] },
  }))
  const save = vi.fn<TargetActions['save']>(async ({ id, version, row }) => ({
    ok: true,
    data: target({ id, name: row.name, version: version + 1 }),
  }))
  const change = vi.fn<TargetActions['change']>(async () => ({ ok: true, data: { changed: [], added: [] } }))
  const others = { add: no, remove: no, restore: no, reorder: no, importRows: no }
  render(
    <NuqsTestingAdapter>
      <TargetsEditor
        contents={given}
        computation={computeProposal(given)}
        readOnly={null}
        actions={{ ...others, ask, saveGroup, removeGroup, save, change }}
      />
      <Toaster />
    </NuqsTestingAdapter>,
  )
  return { ask, saveGroup, removeGroup, save, change, user: userEvent.setup() }
}

const groups = () => within(screen.getByRole('region', { name: 'Groups' }))
const undoKeys = '{Control>}z{/Control}'

beforeEach(() => window.localStorage.clear())

// Seen to fail: with hours rounded as their cell shows them, with versions of later steps not passed on, and with the
// key read while text was being typed.
describe('taking back', () => {
  it('gives hours back to the second, and says so', async () => {
    const { ask, user } = show()
    const cell = screen.getByLabelText<HTMLInputElement>('Hours asked for First')
    await user.clear(cell)
    await user.type(cell, '3')
    await user.tab()
    await waitFor(() => expect(ask).toHaveBeenCalledTimes(1))
    await screen.findByTitle(/^Takes back/)
    // What is being typed has an undo of its own.
    const redshift = screen.getByLabelText<HTMLInputElement>('Redshift of Second')
    await user.type(redshift, '1')
    await user.keyboard(undoKeys)
    expect(ask).toHaveBeenCalledTimes(1)
    await user.type(redshift, '{Escape}')
    await user.click(screen.getByLabelText('Redshift of First'))
    await user.keyboard(undoKeys)
    await waitFor(() => expect(ask).toHaveBeenCalledTimes(2))
    const [back] = ask.mock.calls[1]?.[0].asked ?? []
    expect(back).toMatchObject({ id: 21, version: 5 })
    expect(Math.round(Number(back?.askedHours) * 3600)).toBe(1201)
    await waitFor(() => expect(said()).toContain('Taken back: hours asked for First, 0.3 h again'))
    expect(screen.queryByTitle(/^Takes back/)).toBeNull()
  })

  it('gives a group its rule back over the version that was saved', async () => {
    const { saveGroup, user } = show()
    await user.click(groups().getByRole('button', { name: 'Change the group Pair' }))
    await user.click(groups().getByRole('radio', { name: 'Backup' }))
    await user.click(groups().getByRole('button', { name: 'Save the group' }))
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(1))
    await user.click(await screen.findByTitle(/^Takes back/))
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(2))
    expect(saveGroup.mock.calls[1]?.[0]).toMatchObject({
      ...{ id: 5, version: 3 },
      group: { name: 'Pair', rule: 'all', targetIds: ['11', '12'] },
    })
    await waitFor(() => expect(said()).toContain('Taken back: the change to the group Pair'))
  })

  it('makes a group anew that was taken out, and takes out one that was made', async () => {
    const { saveGroup, removeGroup, user } = show()
    await user.click(groups().getByRole('button', { name: 'Take the group Pair out' }))
    await waitFor(() => expect(said()).toContain('Group Pair taken out'))
    await user.keyboard(undoKeys)
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(1))
    expect(saveGroup.mock.calls[0]?.[0]).toMatchObject({
      ...{ id: null, version: 0 },
      group: { name: 'Pair', rule: 'all', targetIds: ['11', '12'] },
    })
    await user.click(groups().getByRole('button', { name: 'Make a group' }))
    await user.type(groups().getByLabelText('Name'), 'Other')
    await user.click(groups().getByRole('radio', { name: 'All of them' }))
    await user.click(groups().getByRole('checkbox', { name: /^Second/ }))
    await user.click(groups().getByRole('button', { name: 'Save the group' }))
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(2))
    await screen.findByTitle(/^Takes back/)
    await user.keyboard(undoKeys)
    await waitFor(() => expect(removeGroup).toHaveBeenCalledTimes(2))
    expect(removeGroup.mock.calls[1]?.[0]).toMatchObject({
      ...{ id: 9, version: 1 },
      // It had been in the pair.
      back: [{ targetId: 12, groupId: 5 }],
    })
  })

  it('still fits a change to a row that lies below a change to its group', async () => {
    const { saveGroup, save, change, user } = show()
    const cell = screen.getByLabelText<HTMLInputElement>('Redshift of Second')
    await user.clear(cell)
    await user.type(cell, '0.4{Enter}')
    await waitFor(() => expect(save).toHaveBeenCalledTimes(1))
    await user.click(groups().getByRole('button', { name: 'Change the group Pair' }))
    await user.click(groups().getByRole('checkbox', { name: 'Second' }))
    await user.click(groups().getByRole('button', { name: 'Save the group' }))
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(1))
    await user.click(await screen.findByTitle(/^Takes back/))
    await waitFor(() => expect(saveGroup).toHaveBeenCalledTimes(2))
    await user.click(await screen.findByTitle(/^Takes back/))
    await waitFor(() => expect(change).toHaveBeenCalledTimes(1))
    expect(change.mock.calls[0]?.[0].changed).toMatchObject([{ id: 12, version: 7 }])
    await waitFor(() => expect(said()).toContain('Taken back: redshift of Second'))
  })
})
