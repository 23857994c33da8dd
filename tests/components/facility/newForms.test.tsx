import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, it, vi } from 'vitest'
import { NewModeForm, type NewModeFormProps } from '@/components/facility/NewModeForm'
import { NewSiteForm, type NewSiteFormProps } from '@/components/facility/NewSiteForm'
import { RetireForm, type RetireFormProps } from '@/components/facility/RetireForm'
import { modeTyped } from '@/lib/domain/facility/modeForm'
import { slitMode } from '../../support/contents'

// Seen to fail with the other mode's record filled in over the names, with kind chosen beforehand, and with `before`
// left as it was after a stale answer.

vi.mock('next/navigation', () => ({
  useRouter: () => ({ refresh: () => undefined }),
  unstable_rethrow: () => undefined,
}))
vi.setConfig({ testTimeout: 20_000 })

const value = (label: string) => screen.getByLabelText<HTMLInputElement>(label).value

function showMode(action: NewModeFormProps['action'] = async () => ({ ok: true, data: { slug: 'blue' } })) {
  const save = vi.fn(action)
  render(
    <NewModeForm
      instruments={[
        { slug: 'spindle', name: 'SPINDLE', group: 'ALDOUS' },
        { slug: 'ember', name: 'EMBER', group: 'FENNEL' },
      ]}
      patterns={[{ slug: 'spindle-red', name: 'Red', group: 'SPINDLE', typed: modeTyped(slitMode) }]}
      today="2027-03-01"
      action={save}
    />,
  )
  return { save, user: userEvent.setup() }
}

it('begins a mode from another one, keeps its names, and sends what was typed', async () => {
  const { save, user } = showMode()
  await user.type(screen.getByLabelText('Name'), 'Blue')
  await user.type(screen.getByLabelText('Short name'), 'spindle-blue')
  await user.selectOptions(screen.getByLabelText('Instrument'), 'SPINDLE')
  expect(screen.queryByLabelText('Slit width')).toBeNull()
  await user.click(screen.getByRole('button', { name: 'Fill the fields with it' }))
  expect(screen.getByRole('status').textContent).toBe(
    'The fields hold the record of Red now. Change what differs.',
  )
  expect([value('Name'), value('Slit width'), value('Efficiency, row 2')]).toEqual(['Blue', '1', '0.27'])
  await user.clear(screen.getByLabelText('Read noise'))
  await user.type(screen.getByLabelText('Read noise'), '2.5')
  await user.click(screen.getByRole('button', { name: 'Add this mode' }))
  await waitFor(() => expect(save).toHaveBeenCalledTimes(1))
  expect(save.mock.calls[0]?.[0]).toEqual({
    ...modeTyped(slitMode),
    name: 'Blue',
    slug: 'spindle-blue',
    of: 'spindle',
    validFrom: '2027-03-01',
    readNoiseE: '2.5',
  })
})

it('asks for everything that is missing, field by field, and chooses nothing by itself', async () => {
  const { save, user } = showMode()
  await user.type(screen.getByLabelText('Short name'), 'Spindle Blue')
  await user.click(screen.getByRole('button', { name: 'Add this mode' }))
  const summary = await screen.findByRole('group', { name: /to mend/ })
  const said = within(summary)
    .getAllByRole('link')
    .map((link) => link.textContent)
  expect(said).toEqual(
    expect.arrayContaining([
      'Give it a name.',
      'Small letters, digits and single hyphens between them, as quillon-ridge.',
      'Choose the instrument.',
      'Say whether it takes images or spectra.',
      'Say whether wavelengths are in air or in vacuum.',
      'Say what the read noise is of.',
      'Say how the sky is taken off.',
      'A gain is missing.',
      'Give at least two rows.',
    ]),
  )
  expect(value('Short name')).toBe('Spindle Blue')
  expect(save).not.toHaveBeenCalled()
})

it('loses nothing when the short name is taken', async () => {
  const { save, user } = showMode(async () => ({
    ok: false,
    kind: 'invalid',
    message: 'Another mode has this short name.',
    fieldErrors: { slug: 'Another mode has this short name.' },
  }))
  await user.type(screen.getByLabelText('Name'), 'Blue')
  await user.type(screen.getByLabelText('Short name'), 'spindle-red')
  await user.selectOptions(screen.getByLabelText('Instrument'), 'EMBER')
  await user.click(screen.getByRole('button', { name: 'Fill the fields with it' }))
  await user.click(screen.getByRole('button', { name: 'Add this mode' }))
  expect(await screen.findByRole('link', { name: 'Another mode has this short name.' })).toBeTruthy()
  expect(save).toHaveBeenCalledTimes(1)
  expect([value('Name'), value('Short name'), value('Resolving power')]).toEqual([
    'Blue',
    'spindle-red',
    '1400',
  ])
})

it('draws a new site’s tables as they are typed, without an old line', async () => {
  const save = vi.fn<NewSiteFormProps['action']>(async () => ({ ok: true, data: { slug: 'x' } }))
  render(<NewSiteForm today="2027-03-01" action={save} />)
  const user = userEvent.setup()
  const section = screen.getByRole('region', { name: 'Extinction' })
  expect(within(section).queryByRole('img')).toBeNull()
  for (const [band, extinction] of [
    ['V', '0.13'],
    ['r', '0.1'],
  ] as const) {
    await user.click(within(section).getByRole('button', { name: 'Add a row' }))
    const row = within(section).getAllByRole('textbox').length / 2
    await user.type(within(section).getByLabelText(`Band, row ${row}`), band)
    await user.type(within(section).getByLabelText(`Extinction, row ${row}`), extinction)
  }
  expect(within(section).getByRole('img').getAttribute('aria-label')).toMatch(
    /^Extinction, mag an airmass against wavelength, as typed\./,
  )
  await user.click(screen.getByRole('button', { name: 'Add this site' }))
  expect(await screen.findByRole('link', { name: 'A latitude is missing.' })).toBeTruthy()
  expect(value('Extinction, row 2')).toBe('0.1')
})

it('compares with a retirement somebody said meanwhile, and moves it when told to', async () => {
  let answered = 0
  const save = vi.fn<RetireFormProps['action']>(async () => {
    answered += 1
    if (answered > 1) return { ok: true, data: { retiredFrom: '2028-02-01' } }
    return {
      ok: false,
      kind: 'stale',
      message: 'Maud Ferrisay changed this first.',
      fieldErrors: {},
      stale: {
        changedBy: 'Maud Ferrisay',
        changedAt: '2027-03-01T12:00:00.000Z',
        version: 1,
        theirs: { retiredFrom: '2028-01-01' },
      },
    }
  })
  render(
    <RetireForm
      kind="telescope"
      slug="aldous"
      name="ALDOUS"
      retiredFrom={null}
      today="2027-03-01"
      action={save}
    />,
  )
  const user = userEvent.setup()
  const field = screen.getByLabelText('First evening without it')
  await user.clear(field)
  await user.type(field, '1 February')
  await user.click(screen.getByRole('button', { name: 'Retire ALDOUS' }))
  expect(await screen.findByRole('link', { name: 'Give the first evening as year-month-day.' })).toBeTruthy()
  await user.clear(field)
  await user.type(field, '2028-02-01')
  await user.click(screen.getByRole('button', { name: 'Retire ALDOUS' }))
  const comparison = await screen.findByRole('alert', { name: 'Maud Ferrisay changed this' })
  expect(comparison.textContent).toMatch(/2028-01-01.*2028-02-01/)
  await user.click(await within(comparison).findByRole('button', { name: 'Keep mine' }))
  await waitFor(() => expect(save).toHaveBeenCalledTimes(2))
  expect(save.mock.calls.map(([{ before }]) => before)).toEqual([null, '2028-01-01'])
})
