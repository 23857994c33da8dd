import { act, cleanup, fireEvent, render, screen } from '@testing-library/react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { DragHandle } from '@/components/panel/DragHandle'
import { DragReaders } from '@/components/panel/DragReaders'
import { DropPlace } from '@/components/panel/DropPlace'
import { nextSeat } from '@/components/panel/nextSeat'
import { whyNotDropped } from '@/components/panel/whyNotDropped'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'

const toasts = vi.hoisted(() => vi.fn())
vi.mock('@/components/ui/showToast', () => ({ showToast: toasts }))

const row = (proposalId: number, more: Partial<AssignmentRow> = {}): AssignmentRow => ({
  proposalId,
  reviewNumber: `13-00${proposalId}`,
  title: `Question ${proposalId}`,
  kind: 'Regular',
  pages: 2,
  readers: [],
  interests: [],
  affinities: [0.5],
  ...more,
})
const reviewer = {
  personId: 7,
  number: 1,
  name: 'Ayla Stroud',
  mayReview: true,
  hasDeclared: true,
  hasStated: true,
  proposals: 0,
  pages: 0,
  finished: 0,
  owed: [],
  remindedAt: null,
  whyNotReminded: null,
}
const view: AssignmentsView = {
  panelId: 2,
  panelName: 'The panel',
  callId: 1,
  callNumber: 13,
  callSlug: 'call-13',
  phase: 'review',
  quorum: 2,
  reviewsDueAt: '2027-05-01T00:00:00Z',
  rows: [row(1), row(2, { interests: [{ personId: 7, words: 'has declared an interest' }] })],
  reviewers: [reviewer],
  recusals: [],
  groups: 1,
}
const dropped = vi.fn()

beforeEach(() => {
  // jsdom lays nothing out: the two places stand one under the other, the handle above them.
  vi.spyOn(Element.prototype, 'getBoundingClientRect').mockImplementation(function (this: Element) {
    const top = this.textContent === 'one' ? 100 : this.textContent === 'two' ? 200 : 0
    return DOMRect.fromRect({ x: 0, y: top, width: 100, height: 20 })
  })
  render(
    <DragReaders view={view} onDrop={dropped}>
      <DragHandle reader={{ personId: 7, name: 'Ayla Stroud', from: null }} label="Drag Ayla Stroud">
        Ayla Stroud
      </DragHandle>
      {view.rows.map((one, index) => (
        <DropPlace key={one.proposalId} view={view} row={one}>
          {['one', 'two'][index]}
        </DropPlace>
      ))}
    </DragReaders>,
  )
})
afterEach(() => {
  cleanup()
  vi.restoreAllMocks()
  dropped.mockClear()
  toasts.mockClear()
})

const press = async (code: string) => {
  await act(async () => {
    fireEvent.keyDown(document.activeElement ?? document.body, { code, key: code })
    await new Promise((resolve) => setTimeout(resolve, 50))
  })
}
const spoken = () => document.querySelector('[id^=DndLiveRegion]')?.textContent

describe('dragging by the keyboard', () => {
  it('carries a reviewer to a proposal, and says so', async () => {
    screen.getByRole('button', { name: 'Drag Ayla Stroud' }).focus()
    await press('Space')
    await press('ArrowDown')
    await press('ArrowUp')
    expect(spoken()).toBe('Ayla Stroud is over 13-001, Question 1.')
    await press('Space')
    expect(dropped).toHaveBeenCalledWith(expect.objectContaining({ personId: 7 }), view.rows[0])
    expect(spoken()).toBe('Ayla Stroud is dropped on 13-001.')
  })

  it('refuses where there is an interest, with the reason while it is held and after', async () => {
    screen.getByRole('button', { name: 'Drag Ayla Stroud' }).focus()
    await press('Space')
    await press('ArrowDown')
    expect(spoken()).toBe('13-002: cannot be dropped here. Ayla Stroud has declared an interest.')
    expect(screen.getByText('Not 13-002: Ayla Stroud has declared an interest.')).toBeDefined()
    await press('Space')
    expect(dropped).not.toHaveBeenCalled()
    expect(toasts).toHaveBeenCalledWith('13-002 cannot be dropped on. Ayla Stroud has declared an interest.')
  })

  it('is left by escape', async () => {
    screen.getByRole('button', { name: 'Drag Ayla Stroud' }).focus()
    await press('Space')
    await press('ArrowDown')
    await press('Escape')
    expect(dropped).not.toHaveBeenCalled()
    expect(spoken()).toBe('Ayla Stroud is put back.')
  })
})

describe('who may be dropped', () => {
  const read = { assignmentId: 1, personId: 7, seat: 'first' as const, state: 'begun' as const }
  it.each([
    ['may', row(1), 7, null],
    ['an interest', view.rows[1] ?? row(2), 7, /declared an interest/],
    ['reads it', row(1, { readers: [read] }), 7, /reads it already/],
    ['left', row(1), 8, /No longer sits/],
  ] as const)('%s', (_, one, personId, words) => {
    const why = whyNotDropped(view, one, personId)
    if (words === null) expect(why).toBeNull()
    else expect(why).toMatch(words)
  })

  it('takes the first seat that is free', () => {
    const at = (...seats: ('first' | 'second' | 'reader')[]) =>
      nextSeat(row(1, { readers: seats.map((seat, i) => ({ ...read, personId: i, seat })) }))
    expect([at(), at('first'), at('second'), at('first', 'second')]).toEqual([
      'first',
      'second',
      'first',
      'reader',
    ])
  })
})
