import { act, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { NuqsTestingAdapter } from 'nuqs/adapters/testing'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { Yardstick } from '@/components/tools/yardstick/Yardstick'
import { toastStore } from '@/components/ui/toastStore'
import { readState, type Query } from '@/lib/domain/tools/yardstick/stateQuery'

// Seen to fail with the deferred state never followed, with the address not written, with the rows of a long table all
// rendered, and with the message of own parameters at another field.

const copied = vi.fn<(text: string) => Promise<void>>()

function show(query: Query = {}) {
  const { state, troubles } = readState(query)
  return render(
    <NuqsTestingAdapter>
      <Yardstick initial={state} troubles={troubles} />
    </NuqsTestingAdapter>,
  )
}

const numbers = () =>
  screen.getByRole('table', {
    name: /Distances, times and sizes|Against|Redshifts from|Near by|Count in a survey/,
  })
const rowsOf = (table: HTMLElement) =>
  within(table)
    .getAllByRole('row')
    .slice(2)
    .map((row) => row.textContent ?? '')

beforeEach(() => {
  window.history.replaceState(null, '', '/tools/yardstick')
  copied.mockReset().mockResolvedValue()
})

afterEach(() => {
  for (const { id } of toastStore.read()) toastStore.remove(id)
})

/** `userEvent` brings a clipboard of its own; ours records. */
function withClipboard() {
  const user = userEvent.setup()
  Object.defineProperty(navigator, 'clipboard', { value: { writeText: copied }, configurable: true })
  return user
}

describe('Yardstick', () => {
  it('answers while one types, and puts it into the address', async () => {
    const user = userEvent.setup()
    show({ z: '1', c: 'planck-2018' })
    // Astropy, Planck18.luminosity_distance: 6791.27 at z = 1, 15924.6 at z = 2.
    expect(rowsOf(numbers())[0]).toContain('6,791.3')
    await user.type(screen.getByLabelText('Redshifts'), '{Enter}2')
    await waitFor(() => expect(rowsOf(numbers())[1]).toContain('15,924.6'))
    await waitFor(() => expect(window.location.search).toBe('?z=1+2&c=planck-2018'))
  })

  it('keeps what cannot be read, and says why at the list', async () => {
    show({ z: 'nan 1e9 -1 0.5', c: 'planck-2018' })
    const list = screen.getByLabelText<HTMLTextAreaElement>('Redshifts')
    expect(list.value).toBe('nan\n1e9\n-1\n0.5')
    expect(list).toHaveProperty('ariaInvalid')
    expect(list.getAttribute('aria-invalid')).toBe('true')
    const described = list.getAttribute('aria-describedby')?.split(' ') ?? []
    const message = document.getElementById(described[0] ?? '')?.textContent
    expect(message).toBe(
      'nan: a redshift is a number, such as 0.158.1e9: the engine stops before z = 10⁹.-1: a redshift lies above −1.',
    )
    expect(rowsOf(numbers())).toHaveLength(1)
  })

  it('says where a universe without a big bang turned, in its sentence and in the table', () => {
    show({ z: '0.5 2', c: ['planck-2018', 'H0:70,Om0:0.3,Ode0:1.75'] })
    const kinds = screen.getByRole('list', { name: 'What kind of universe each cosmology is' })
    expect(within(kinds).getByText(/without a big bang/).textContent).toMatch(/z = 0.92/)
    expect(within(kinds).getByText(/turned at z = 0.92, so z = 2.00 does not exist in it/)).toBeTruthy()
    expect(rowsOf(numbers())[1]).toMatch(/does not exist: past the turn at z = 0.92$/)
  })

  it('opens own parameters that make no universe, with the sentence at their field', async () => {
    const user = userEvent.setup()
    show({ c: ['planck-2018', 'H0:0,Om0:0.3'] })
    const field = screen.getByLabelText<HTMLInputElement>('H₀')
    expect(
      document.getElementById(field.getAttribute('aria-describedby')?.split(' ')[0] ?? '')?.textContent,
    ).toBe('The Hubble constant H₀ must be above 0 km/s/Mpc.')
    await user.clear(field)
    await user.type(field, '0.0677 km/s/kpc')
    await waitFor(() => expect(field.getAttribute('aria-invalid')).toBeNull())
    const panel = screen.getByRole('region', { name: 'Own parameters' })
    expect(panel.textContent).toMatch(/Ωk is exactly 0: flat\./)
  })

  it('says what the choice does to an exposure, and that an observed magnitude knows none', () => {
    show({ mode: 'compare', z: '2', c: ['planck-2018', 'local-ladder'] })
    const table = screen.getByRole('table', { name: 'Exposure times at z = 2 against Planck 2018' })
    // D_L of Astropy's FlatLambdaCDM(73.04, 0.3 + neutrinos) over Planck18 at z = 2: 0.9341.
    const [, row] = within(table).getAllByRole('row')
    expect(row?.textContent).toMatch(
      /Local ladder.*0\.87\d times as long.*0\.76\d times as long.*no difference/,
    )
  })

  it('finds redshifts of quantities with any unit', async () => {
    const user = userEvent.setup()
    show({ mode: 'inverse', from: 'luminosityMpc', values: '6791.27 Mpc', c: 'planck-2018' })
    expect(rowsOf(numbers())[0]).toMatch(/1\.0000$/)
    const list = screen.getByLabelText('Values')
    await user.clear(list)
    await user.type(list, '15.9246 Gpc{Enter}3 Gyr')
    await waitFor(() => expect(rowsOf(numbers())[0]).toMatch(/2\.0000$/))
    expect(
      screen.getByText('3 Gyr: A luminosity distance is given in Mpc or alike, such as 1.2 Gpc.'),
    ).toBeTruthy()
  })

  it('says near by when a redshift is no distance', () => {
    show({ mode: 'near', z: '0.003 0.1', c: 'planck-2018' })
    expect(screen.getByText(/One redshift is no distance: 0\.003\./)).toBeTruthy()
    expect(rowsOf(numbers()).map((row) => row.endsWith('no: measure it'))).toEqual([true, false])
  })

  it('counts in the shells of a survey, and says what cannot be read or is not known', async () => {
    const user = userEvent.setup()
    show({ mode: 'survey', z: '1.75 2.25', c: 'planck-2018', area: '160 arcmin²', mass: 'above-11.0' })
    const [row] = rowsOf(numbers())
    // Moster et al. 2011: 38 % for this field, depth and mass.
    expect(row).toMatch(/^1\.75.*2\.25.*38\.\d/)
    const area = screen.getByLabelText('Area')
    await user.clear(area)
    await user.type(area, '20 deg²')
    await waitFor(() =>
      expect(
        screen.getByText(
          'Cosmic variance is known for areas from 11 square arcminutes to 1.96 square degrees.',
        ),
      ).toBeTruthy(),
    )
    await user.clear(area)
    await user.type(area, '3 Mpc')
    expect(
      screen.getByText('An area is given in square degrees or alike, such as 1.5 deg² or 160 arcmin².'),
    ).toBeTruthy()
    const list = screen.getByLabelText('Redshifts')
    await user.clear(list)
    await user.type(list, '1')
    expect(screen.getByText('Give two redshifts at least: the edges of a shell.')).toBeTruthy()
  })

  it('copies the table with its cosmology and says so', async () => {
    const user = withClipboard()
    show({ z: '1', c: 'planck-2018' })
    await user.click(screen.getByRole('button', { name: 'Copy as ECSV' }))
    expect(copied.mock.lastCall?.[0]).toMatch(/^# %ECSV 1\.0\n[^]*- \{H0: 67\.66\}[^]*\n1,6791\.2\d+/)
    await waitFor(() => expect(toastStore.read().at(-1)?.words).toBe('Copied one row as ECSV.'))
    copied.mockRejectedValue(new Error('denied'))
    await user.click(screen.getByRole('button', { name: 'Copy as text' }))
    await waitFor(() => expect(toastStore.read().at(-1)?.words).toMatch(/does not allow copying/))
  })

  it('opens a number to its formula, its inputs and another opinion', async () => {
    const user = userEvent.setup()
    show({ z: '1', c: ['planck-2018', 'local-ladder'] })
    await user.click(screen.getByRole('button', { name: '6,791.3' }))
    const panel = await screen.findByRole('dialog', { name: /luminosity distance, z = 1/ })
    expect(panel.textContent).toMatch(
      /DL = \(1 \+ z\) DM.*67\.66 km\/s\/Mpc.*Under Local ladder.*Hogg 1999.*eq\. 21/,
    )
  })

  it('shows a thousand rows by rendering those in sight', async () => {
    const { container } = show({ z: '0.001..2 step 0.001', c: 'planck-2018' })
    const table = numbers()
    expect(table.getAttribute('aria-rowcount')).toBe('1001')
    expect(container.querySelectorAll('.table-figures tbody tr').length).toBeLessThan(80)
    expect(screen.getByText(/1,000 redshifts are shown and 1,000 more are not/)).toBeTruthy()
    const frame = container.querySelector('.table-tall')
    if (!frame) throw new Error('A long table has its own frame.')
    act(() => {
      frame.scrollTop = 36 * 500
      frame.dispatchEvent(new Event('scroll'))
    })
    expect(within(table).getByRole('rowheader', { name: '0.501' })).toBeTruthy()
    expect(within(table).queryByRole('rowheader', { name: '0.001' })).toBeNull()
  })

  it('takes the first thousand of hundreds of thousands pasted, and says so', async () => {
    const user = userEvent.setup()
    show({ z: '1', c: 'planck-2018' })
    const list = screen.getByLabelText<HTMLTextAreaElement>('Redshifts')
    list.setSelectionRange(0, 1)
    list.focus()
    await user.paste(Array.from({ length: 200_000 }, (_, i) => (i / 1e5).toFixed(5)).join(', '))
    expect(screen.getByText(/^200,000 values were pasted and the first 1,000 taken\./)).toBeTruthy()
    expect(list.value.split(', ')).toHaveLength(1000)
    expect(list.value).toMatch(/, 0\.00999$/)
  })

  it('begins anew, and takes that back', async () => {
    const user = userEvent.setup()
    show({ z: '3', mode: 'compare' })
    await user.click(screen.getByRole('button', { name: 'Begin anew' }))
    await waitFor(() => expect(window.location.search).toBe(''))
    expect(screen.queryByRole('button', { name: 'Begin anew' })).toBeNull()
    act(() => toastStore.read().at(-1)?.undo?.())
    await waitFor(() => expect(window.location.search).toBe('?mode=compare&z=3'))
  })

  it('takes one to six cosmologies, each with its own line', async () => {
    const user = userEvent.setup()
    show({ z: '1' })
    await user.click(screen.getByRole('button', { name: 'Add a cosmology' }))
    await user.click(await screen.findByRole('button', { name: /WMAP 9/ }))
    await waitFor(() => expect(within(numbers()).getByText('WMAP 9')).toBeTruthy())
    for (const name of ['Planck 2018', 'Local ladder, H₀ 73.04', 'Einstein–de Sitter'])
      await user.click(screen.getByRole('button', { name: `Take away ${name}` }))
    await waitFor(() => expect(screen.queryByRole('button', { name: /^Take away/ })).toBeNull())
    await waitFor(() => expect(window.location.search).toBe('?z=1&c=wmap-9'))
  })
})
