import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, it, vi } from 'vitest'
import { InterestsForm, type InterestsFormProps } from '@/components/reviews/InterestsForm'
import type { ListedName } from '@/lib/domain/conflicts/types'

const name = (key: string, over: Partial<ListedName>): ListedName => ({
  key: `n${key.repeat(16)}`,
  name: `Person ${key}`,
  institute: 'Somewhere',
  foundAs: null,
  declaredAs: null,
  ...over,
})
const names = [
  name('a', {}),
  name('b', { foundAs: 'institute' }),
  name('c', { declaredAs: 'rival' }),
  name('d', {}),
]

it('asks for the kind of each tick and for the whole list, then sends what was ticked', async () => {
  const action = vi.fn<InterestsFormProps['action']>().mockResolvedValue({ ok: true, data: null })
  render(<InterestsForm callSlug="call-14" names={names} action={action} />)
  expect(screen.getByText('Your institute: found by itself')).toBeTruthy()
  expect(screen.getByText('Declared: we compete for the same answer')).toBeTruthy()
  expect(screen.queryByRole('checkbox', { name: 'Person b' })).toBeNull()

  await userEvent.click(screen.getByRole('checkbox', { name: 'Person d' }))
  await userEvent.click(screen.getByRole('button', { name: 'Save and go to my reviews' }))
  expect((await screen.findAllByText('Say which kind of interest it is.')).length).toBeGreaterThan(0)
  expect(screen.getAllByText('Go through the whole list first, then tick this.').length).toBeGreaterThan(0)
  expect(action).not.toHaveBeenCalled()

  await userEvent.selectOptions(
    screen.getByRole('combobox', { name: 'Kind of interest with Person d' }),
    'family',
  )
  await userEvent.click(screen.getByRole('checkbox', { name: 'I have been through all the names' }))
  await userEvent.click(screen.getByRole('button', { name: 'Save and go to my reviews' }))
  await vi.waitFor(() => expect(action).toHaveBeenCalledTimes(1))
  expect(action.mock.calls[0]?.[0]).toMatchObject({
    callSlug: 'call-14',
    wentThrough: true,
    names: {
      [names[3]?.key ?? '']: { ticked: true, kind: 'family' },
      [names[0]?.key ?? '']: { ticked: false },
    },
  })
})
