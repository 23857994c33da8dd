import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'

const labels = { title: 'Title', abstract: 'Abstract', category: 'Category' }
const base = { title: 'Dust', abstract: 'One.\n\nTwo.\n\nThree.', category: 'galaxies' }
const stale = { changedBy: 'Odo Pellering', changedAt: '2027-03-01T02:14:00Z' }

function show(theirs: Partial<typeof base>, mine: Partial<typeof base>) {
  const onChoose = vi.fn<(values: typeof base) => void>()
  render(
    <ChooseByField
      stale={stale}
      versions={{ base, theirs: { ...base, ...theirs }, mine: { ...base, ...mine } }}
      labels={labels}
      prose={['abstract']}
      onChoose={onChoose}
    />,
  )
  return onChoose
}

const press = (name: string) => userEvent.click(screen.getByRole('button', { name }))

// Seen to fail with a field that only the other changed suggested as mine, and with passages not asked for by field.
describe('choosing between two versions', () => {
  it('takes each field from whoever alone changed it, unless one says otherwise', async () => {
    const onChoose = show({ title: 'Cold dust' }, { category: 'quasars' })
    expect(screen.getAllByRole('group').map((group) => group.textContent)).toHaveLength(2)
    await press('Keep this choice')
    expect(onChoose).toHaveBeenCalledWith({ ...base, title: 'Cold dust', category: 'quasars' })
  })

  it('waits for a choice where both changed a field', async () => {
    const onChoose = show({ title: 'Cold dust' }, { title: 'Warm dust' })
    await press('Keep this choice')
    expect(onChoose).not.toHaveBeenCalled()
    expect(screen.getByText('One choice to make')).toBeDefined()
    await userEvent.click(screen.getByRole('radio', { name: /theirs/ }))
    await press('Keep this choice')
    expect(onChoose).toHaveBeenCalledWith({ ...base, title: 'Cold dust' })
  })

  it('keeps both changes to one text where they fit together', async () => {
    const onChoose = show({ abstract: 'One, now.\n\nTwo.\n\nThree.' }, { abstract: 'One.\n\nTwo.\n\nThree!' })
    await press('Keep both')
    expect(onChoose).toHaveBeenCalledWith({ ...base, abstract: 'One, now.\n\nTwo.\n\nThree!' })
  })

  it('asks passage by passage where they do not', async () => {
    const onChoose = show(
      { abstract: 'Theirs.\n\nTwo.\n\nTheirs too.' },
      { abstract: 'Mine.\n\nTwo.\n\nMine too.' },
    )
    const choose = (passage: RegExp, whose: RegExp) =>
      userEvent.click(
        within(screen.getByRole('group', { name: passage })).getByRole('radio', { name: whose }),
      )
    await choose(/Abstract, passage 1 of 2/, /theirs/)
    await choose(/Abstract, passage 2 of 2/, /yours/)
    await press('Keep this choice')
    expect(onChoose).toHaveBeenCalledWith({ ...base, abstract: 'Theirs.\n\nTwo.\n\nMine too.' })
  })

  it('takes all of one side at a press', async () => {
    const onChoose = show({ title: 'Cold dust' }, { title: 'Warm dust', category: 'quasars' })
    await press('Take all of theirs')
    expect(onChoose).toHaveBeenLastCalledWith({ ...base, title: 'Cold dust' })
    await press('Keep all of mine')
    expect(onChoose).toHaveBeenLastCalledWith({ ...base, title: 'Warm dust', category: 'quasars' })
  })
})
