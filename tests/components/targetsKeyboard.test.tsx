import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { NuqsTestingAdapter } from 'nuqs/adapters/testing'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { TargetsEditor } from '@/components/targets/TargetsEditor'
import type { TargetActions } from '@/components/targets/targetActions'
import { computeProposal } from '@/lib/domain/observations/rules'
import { targetRow } from '@/lib/domain/targets/rules'
import { contents, target } from '../support/contents'

vi.setConfig({ testTimeout: 20_000 })

const first = { ...target(), id: 11, name: 'First', position: 1 }
const second = { ...target(), id: 12, name: 'Second', position: 2 }
const given = { ...contents(), targets: [first, second], observations: [] }
const no = async () => ({ ok: false as const, kind: 'invalid' as const, message: 'No.', fieldErrors: {} })

function show() {
  const change = vi.fn<TargetActions['change']>(async ({ changed, added }) => ({
    ok: true,
    data: {
      changed: changed.map(({ id, version, row }) => ({
        ...(id === 11 ? first : second),
        ...{ name: row.name, redshiftTyped: row.redshift, version: version + 1 },
      })),
      added: added.map((row, index) => ({ ...target(), id: 50 + index, name: row.name, version: 1 })),
    },
  }))
  const save = vi.fn<TargetActions['save']>(async ({ id, version, row }) => ({
    ok: true,
    data: { ...first, id, name: row.name, redshiftTyped: row.redshift, version: version + 1 },
  }))
  const rest = { add: no, remove: no, restore: no, reorder: no, importRows: no, ask: no }
  render(
    <NuqsTestingAdapter>
      <TargetsEditor
        contents={given}
        computation={computeProposal(given)}
        readOnly={null}
        actions={{ ...rest, saveGroup: no, removeGroup: no, change, save }}
      />
    </NuqsTestingAdapter>,
  )
  return { change, save }
}

const cell = (label: string) => screen.getByLabelText<HTMLInputElement>(label)
const focused = () => document.activeElement?.getAttribute('aria-label')

beforeEach(() => {
  localStorage.clear()
})

// Seen to fail with the arrows left to the text, with rows sent one by one, and with undo saving what is typed.
describe('the table of targets at the keyboard', () => {
  it('moves as a spreadsheet does', async () => {
    show()
    const user = userEvent.setup()
    await user.click(cell('Redshift of First'))
    await user.keyboard('{ArrowDown}')
    expect(focused()).toBe('Redshift of Second')
    await user.keyboard('{ArrowLeft}')
    expect(focused()).toBe('Declination of Second')
    await user.keyboard('{ArrowRight}{ArrowRight}')
    expect(focused()).toBe('Magnitude of Second')
    await user.keyboard('{ArrowUp}')
    expect(focused()).toBe('Magnitude of First')
    await user.keyboard('{Enter}')
    expect(focused()).toBe('Magnitude of Second')
    await user.keyboard('{Shift>}{Enter}{/Shift}')
    expect(focused()).toBe('Magnitude of First')
  })

  it('stays in a text whose end is not reached', async () => {
    show()
    const user = userEvent.setup()
    await user.click(cell('Name of target 1'))
    cell('Name of target 1').setSelectionRange(2, 2)
    await user.keyboard('{ArrowRight}')
    expect(focused()).toBe('Name of target 1')
  })

  it('takes a block of cells, changing rows and adding those beyond the last', async () => {
    const { change, save } = show()
    const user = userEvent.setup()
    await user.click(cell('Name of target 2'))
    await user.paste('Two\t12 29 06.7\t+02 03 09\t0.25\t19.5\r\nThree\t150.1\t2.2\t0.7\t20.1\tV Vega\r\n')
    await waitFor(() => expect(change).toHaveBeenCalledTimes(1))
    const sent = change.mock.calls[0]?.[0]
    expect(sent?.changed).toMatchObject([
      { id: 12, version: 1, row: { name: 'Two', ra: '12 29 06.7', redshift: '0.25', magnitude: '19.5' } },
    ])
    expect(sent?.added).toMatchObject([{ name: 'Three', dec: '2.2', magnitude: '20.1', band: 'V Vega' }])
    expect(sent?.removed).toEqual([])
    expect(save).not.toHaveBeenCalled()
    await waitFor(() => expect(cell('Name of target 2').value).toBe('Two'))
  })

  it('types what cannot be read into its cell, says why, and saves the rest', async () => {
    const { change } = show()
    const user = userEvent.setup()
    await user.click(cell('Redshift of First'))
    await user.paste('0.3\nfar away')
    await waitFor(() => expect(change).toHaveBeenCalledTimes(1))
    expect(change.mock.calls[0]?.[0].changed).toMatchObject([{ id: 11, row: { redshift: '0.3' } }])
    expect(cell('Redshift of Second').value).toBe('far away')
    await waitFor(() => expect(cell('Redshift of Second').getAttribute('aria-invalid')).toBe('true'))
  })

  it('refuses a block too wide for where it is pasted, and changes nothing', async () => {
    const { change } = show()
    const user = userEvent.setup()
    await user.click(cell('Redshift of First'))
    await user.paste('0.3\t19\tr AB\t12')
    expect(change).not.toHaveBeenCalled()
    expect(cell('Redshift of First').value).toBe(targetRow(first).redshift)
  })

  it('takes the last change back with the usual keys, and a pasted block whole', async () => {
    const { change, save } = show()
    const user = userEvent.setup()
    await user.clear(cell('Redshift of First'))
    await user.type(cell('Redshift of First'), '0.4{Enter}')
    await waitFor(() => expect(save).toHaveBeenCalledTimes(1))
    await user.keyboard('{Control>}z{/Control}')
    await waitFor(() => expect(change).toHaveBeenCalledTimes(1))
    expect(change.mock.calls[0]?.[0]).toMatchObject({
      changed: [{ id: 11, version: 2, row: { redshift: targetRow(first).redshift } }],
      removed: [],
    })
    await user.click(cell('Name of target 1'))
    await user.paste('One\nTwo\nThree')
    await waitFor(() => expect(change).toHaveBeenCalledTimes(2))
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    await waitFor(() => expect(change).toHaveBeenCalledTimes(3))
    expect(change.mock.calls[2]?.[0].changed).toHaveLength(2)
  })
})
