import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { readFileSync } from 'node:fs'
import { expect, it, vi } from 'vitest'
import { ImportPanel } from '@/components/targets/ImportPanel'
import type { TargetActions } from '@/components/targets/targetActions'
import { contents } from '../support/contents'

function show() {
  const importRows = vi.fn<TargetActions['importRows']>(async ({ rows }) => ({
    ok: true,
    data: { added: rows.length, present: 0 },
  }))
  render(<ImportPanel contents={contents()} importRows={importRows} />)
  return { importRows, user: userEvent.setup({ applyAccept: false }) }
}

const chosen = (select: HTMLElement) => (select as HTMLSelectElement).selectedOptions[0]?.textContent

/** A file whose bytes can be read: the browser's own way is missing in jsdom. */
const fileOf = (name: string, text: string) =>
  Object.assign(new File([text], name), { arrayBuffer: async () => new TextEncoder().encode(text).buffer })

const choose = async (user: ReturnType<typeof userEvent.setup>, name: string, text: string) => {
  await user.upload(screen.getByLabelText('File of targets'), fileOf(name, text))
  await screen.findByText(/not kept yet/)
}

const sample = (name: string) => readFileSync(`tests/reference/targets/${name}`, 'utf8')

it('shows what each column was taken for before anything is kept', async () => {
  const { user, importRows } = show()
  await choose(user, 'told.vot', sample('told-1.4.vot'))
  expect(chosen(screen.getByLabelText('What c2 is read as'))).toBe('Right ascension')
  expect(screen.getByText('rad, turned into deg')).toBeTruthy()
  expect(screen.getByText(/nine columns taken, none left out/)).toBeTruthy()
  expect(importRows).not.toHaveBeenCalled()
  await user.click(screen.getByRole('button', { name: 'Keep four targets' }))
  expect(importRows.mock.calls[0]?.[0].rows[1]).toMatchObject({ name: 'Lamp 27 "south"', lineName: 'Hα' })
})

it('takes a column for something else, and leaves out the one that was it', async () => {
  const { user, importRows } = show()
  await choose(user, 'list.csv', 'Galaxy,z,zfit,colour\nA,0.1,0.2,red\nB,0.3,0.4,blue\n')
  expect(screen.getByText(/left out: Galaxy, zfit and colour/)).toBeTruthy()
  expect(screen.queryByRole('button', { name: /^Keep/ })).toBeNull()
  await user.selectOptions(screen.getByLabelText('What Galaxy is read as'), 'Name')
  await user.selectOptions(screen.getByLabelText('What zfit is read as'), 'Redshift')
  expect(chosen(screen.getByLabelText('What z is read as'))).toBe('left out')
  await user.click(screen.getByRole('button', { name: 'Keep two targets' }))
  expect(importRows.mock.calls[0]?.[0].rows.map(({ name, redshift }) => [name, redshift])).toEqual([
    ['A', '0.2'],
    ['B', '0.4'],
  ])
})

it('opens the cell that is wrong, whichever it is, and is content once it is mended', async () => {
  const { user } = show()
  await choose(user, 'list.csv', 'name,Re [pix]\nA,3\n')
  expect(screen.getAllByText('The unit “pix” is not known here.')).not.toHaveLength(0)
  await user.click(screen.getByRole('button', { name: 'Mend row 1' }))
  const cell = screen.getByLabelText('Half-light radius of row 1')
  await user.clear(cell)
  await user.type(cell, '0.8')
  expect(screen.getByRole('button', { name: 'Keep one target' })).toBeTruthy()
})

it('keeps none of more targets than a proposal holds', async () => {
  const { user } = show()
  await choose(user, 'many.csv', `name\n${Array.from({ length: 501 }, (_, i) => `T${i}`).join('\n')}`)
  expect(screen.getByText(/A proposal holds at most 500 targets/)).toBeTruthy()
  expect(screen.queryByRole('button', { name: /^Keep/ })).toBeNull()
  await user.click(screen.getByRole('button', { name: 'See all rows' }))
  expect(within(screen.getByRole('table', { name: 'Rows of many.csv' })).getAllByRole('row')).toHaveLength(
    101,
  )
  expect(screen.getByText('100 of 501 rows stand here, those to mend first.')).toBeTruthy()
})

it('tells which groups a file makes, before anything is kept', async () => {
  const { user, importRows } = show()
  await choose(user, 'list.csv', 'name,ra,dec,z,group\nA,10,-20,0.1,Near\nB,11,-21,0.3,near\nC,12,-22,0.3,\n')
  expect(
    screen.getByText('The group Near is not here yet: it is made, all of its targets wanted.'),
  ).toBeTruthy()
  await user.click(screen.getByRole('button', { name: 'Keep three targets' }))
  expect(importRows.mock.calls[0]?.[0].rows.map(({ group }) => group)).toEqual(['Near', 'near', ''])
})
