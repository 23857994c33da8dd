import { act, fireEvent, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { Button } from '@/components/ui/Button'
import { Chip } from '@/components/ui/Chip'
import { ComputedNumber } from '@/components/ui/ComputedNumber'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { Countdown } from '@/components/ui/Countdown'
import { DateLine } from '@/components/ui/DateLine'
import { LedgerGroup } from '@/components/ui/LedgerGroup'
import { LedgerList } from '@/components/ui/LedgerList'
import { LedgerRow } from '@/components/ui/LedgerRow'
import { PhoneTabs } from '@/components/ui/PhoneTabs'
import { SectionState } from '@/components/ui/SectionState'
import { showToast } from '@/components/ui/showToast'
import { Timeline } from '@/components/ui/Timeline'
import { Toaster } from '@/components/ui/Toaster'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { verdictGlyphPath } from '@/components/ui/verdictGlyphPath'

// Seen to fail with offReason ignored by Button, with the verdict's word left out, and with the undo left out.

describe('a button that is off', () => {
  it('keeps the focus, says why, and does nothing', async () => {
    const user = userEvent.setup()
    const press = vi.fn()
    render(
      <Button onClick={press} offReason="waits for People">
        Send
      </Button>,
    )
    const button = screen.getByRole('button', { name: 'Send' })
    await user.click(button)
    expect(press).not.toHaveBeenCalled()
    expect(document.activeElement).toBe(button)
    expect(button.getAttribute('aria-disabled')).toBe('true')
    expect(document.getElementById(button.getAttribute('aria-describedby') ?? '')?.textContent).toBe(
      'waits for People',
    )
  })
})

describe('verdicts', () => {
  it.each([
    ['feasible', 'feasible', 6],
    ['marginal', 'marginal', 12],
    ['not-feasible', 'not feasible', 16],
    ['accepted', 'accepted', 6],
    ['change', 'change', 12],
    ['not-possible', 'not possible', 16],
  ] as const)('%s is a bar with the word "%s"', (verdict, word, end) => {
    const { container } = render(<VerdictMark verdict={verdict} />)
    expect(screen.getByText(word)).toBeTruthy()
    expect(container.querySelector('path')?.getAttribute('d')).toBe(`M9 0H10.5V12H9ZM0 4H${end}V8H0Z`)
  })
  it('draws the bar clear of, just over and well past the tick', () => {
    expect(['clear', 'touching', 'past'].map((shape) => verdictGlyphPath(shape as 'clear'))).toHaveLength(3)
  })
})

describe('a ledger', () => {
  it('groups rows under questions, with links and states', () => {
    render(
      <LedgerList>
        <LedgerGroup title="Can it be done?">
          <LedgerRow label="Feasibility" href="/feasibility" aside={<SectionState state="needs-you" />}>
            The line falls in a water band
          </LedgerRow>
          <LedgerRow label="Send" aside={<SectionState state="waits" waitsFor="feasibility" />} />
        </LedgerGroup>
      </LedgerList>,
    )
    const group = screen.getByRole('region', { name: 'Can it be done?' })
    expect(within(group).getByRole('link', { name: 'Feasibility' }).getAttribute('href')).toBe('/feasibility')
    expect(within(group).getByText('needs you')).toBeTruthy()
    expect(within(group).getByText('waits for feasibility')).toBeTruthy()
  })
})

describe('chips', () => {
  it('say whether they are chosen, and can be taken away', async () => {
    const user = userEvent.setup()
    const press = vi.fn()
    render(
      <>
        <Chip label="All 24" pressed onPress={press} />
        <Chip label="EMBER" removable onPress={press} />
      </>,
    )
    expect(screen.getByRole('button', { name: 'All 24' }).getAttribute('aria-pressed')).toBe('true')
    await user.click(screen.getByRole('button', { name: 'Take away EMBER' }))
    expect(press).toHaveBeenCalledTimes(1)
  })
})

describe('a computed number', () => {
  it('opens from the keyboard to formula, inputs, second opinion and source', async () => {
    const user = userEvent.setup()
    render(
      <ComputedNumber
        shown="8.594"
        value="8.594 kpc/″"
        what="proper scale"
        formula="s = D π / 648,000"
        inputs={[{ term: 'z', value: '1.290' }]}
        second={{ term: 'Under Local ladder', value: '8.022 kpc/″', difference: '−6.6 %' }}
        source="Hogg 1999, eq. 18."
      />,
    )
    const number = screen.getByRole('button', { name: '8.594 kpc/″, proper scale: how it was computed' })
    number.focus()
    await user.keyboard('{Enter}')
    const panel = await screen.findByRole('dialog', { name: 'How proper scale was computed' })
    for (const words of ['s = D π / 648,000', '1.290', '−6.6 %', 'Hogg 1999, eq. 18.']) {
      expect(panel.textContent).toContain(words)
    }
    await user.keyboard('{Escape}')
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull())
    expect(document.activeElement).toBe(number)
  })
})

describe('a deed that must be typed', () => {
  // jsdom knows the element but not its modal state.
  beforeEach(() => {
    HTMLDialogElement.prototype.showModal = function (this: HTMLDialogElement) {
      this.open = true
    }
    HTMLDialogElement.prototype.close = function (this: HTMLDialogElement) {
      this.open = false
      this.dispatchEvent(new Event('close'))
    }
  })

  const confirm = vi.fn<() => Promise<string | null>>()
  const refund = () => (
    <ConfirmTyped
      trigger="Refund …"
      title="Refund this fee"
      expected="2M0-YXC"
      expectedName="the reference"
      confirm="Refund EUR 60.00"
      busyWord="Refunding"
      onConfirm={confirm}
    >
      The money goes back to the card.
    </ConfirmTyped>
  )

  it('works only once the name is there, in any case', async () => {
    const user = userEvent.setup()
    confirm.mockReset().mockResolvedValue(null)
    render(refund())
    await user.click(screen.getByRole('button', { name: 'Refund …' }))
    const dialog = screen.getByRole('dialog', { name: 'Refund this fee' })
    await user.click(within(dialog).getByRole('button', { name: 'Refund EUR 60.00' }))
    expect(confirm).not.toHaveBeenCalled()
    await user.type(within(dialog).getByLabelText('Type the reference, 2M0-YXC'), '2m0-yxc')
    await user.click(within(dialog).getByRole('button', { name: 'Refund EUR 60.00' }))
    expect(confirm).toHaveBeenCalledTimes(1)
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull())
  })

  it('says why it was not done, and keeps what was typed', async () => {
    const user = userEvent.setup()
    confirm.mockReset().mockResolvedValue('The payment firm does not answer.')
    render(refund())
    await user.click(screen.getByRole('button', { name: 'Refund …' }))
    const field = screen.getByLabelText<HTMLInputElement>('Type the reference, 2M0-YXC')
    await user.type(field, '2M0-YXC{Enter}')
    expect((await screen.findByRole('alert')).textContent).toBe('The payment firm does not answer.')
    expect(field.value).toBe('2M0-YXC')
  })
})

describe('a toast', () => {
  it('is said, and can be taken back', async () => {
    const user = userEvent.setup()
    const undo = vi.fn()
    render(<Toaster />)
    act(() => showToast('Draft put away', { undo }))
    expect((await screen.findAllByText('Draft put away')).length).toBeGreaterThan(0)
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    expect(undo).toHaveBeenCalledTimes(1)
    await waitFor(() => expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull())
  })
})

describe('tabs of the phone', () => {
  it('move by arrows and show one panel as chosen', async () => {
    const user = userEvent.setup()
    render(
      <PhoneTabs
        label="The review"
        wide="grid"
        panels={[
          { id: 'packet', label: 'Packet', content: 'paper' },
          { id: 'score', label: 'Score, 3 of 4', content: 'sheet' },
        ]}
      />,
    )
    screen.getByRole('tab', { name: 'Packet' }).focus()
    await user.keyboard('{ArrowRight}')
    const tab = screen.getByRole('tab', { name: 'Score, 3 of 4' })
    expect(document.activeElement).toBe(tab)
    expect(tab.getAttribute('aria-selected')).toBe('true')
    await user.keyboard('{ArrowRight}')
    expect(screen.getByRole('tab', { name: 'Packet' }).getAttribute('aria-selected')).toBe('true')
  })
})

describe('time', () => {
  beforeEach(() => {
    vi.useFakeTimers({ now: new Date('2027-03-31T21:57:00Z') })
  })
  afterEach(() => {
    vi.useRealTimers()
  })

  it('runs down by the server’s clock, not the reader’s', () => {
    // The reader's clock is a minute behind: the server says 21:58.
    const until = Date.parse('2027-03-31T22:00:00Z')
    render(<Countdown untilMs={until} serverNowMs={Date.parse('2027-03-31T21:58:00Z')} passed="closed" />)
    expect(document.body.textContent).toBe('2\u00a0min')
    act(() => vi.advanceTimersByTime(90_000))
    expect(document.body.textContent).toBe('30\u00a0s')
    act(() => vi.advanceTimersByTime(31_000))
    expect(document.body.textContent).toBe('closed')
  })

  it('stands on a line of dates, the next one with its hour', () => {
    render(
      <DateLine
        label="Dates of call 14"
        now={new Date('2027-03-18T02:14:00Z')}
        entries={[
          { at: new Date('2027-02-01T00:00:00Z'), words: 'Call 14 opened', dayOnly: true },
          { at: new Date('2027-03-31T22:00:00Z'), words: 'Proposals close' },
        ]}
      />,
    )
    const items = within(screen.getByRole('list', { name: 'Dates of call 14' })).getAllByRole('listitem')
    expect(items.map((item) => item.textContent)).toEqual([
      '1 FebruaryCall 14 opened',
      '31 March 22:00 UTCProposals close',
    ])
  })

  it('is told day by day, to the second', () => {
    render(
      <Timeline
        days={[
          {
            day: '31 March',
            entries: [{ time: '21:59:31', words: 'Card refused by the bank', tone: 'refused' }],
          },
        ]}
      />,
    )
    const day = screen.getByRole('region', { name: '31 March' })
    expect(within(day).getByRole('listitem').textContent).toBe('21:59:31Card refused by the bank')
  })
})

describe('Enter in a dialog’s field', () => {
  it('does not send while the name is missing', () => {
    const confirm = vi.fn<() => Promise<string | null>>()
    render(
      <ConfirmTyped
        trigger="Go"
        title="Go"
        expected="A"
        expectedName="the name"
        confirm="Do it"
        busyWord="Doing"
        onConfirm={confirm}
      >
        It is done.
      </ConfirmTyped>,
    )
    fireEvent.click(screen.getByRole('button', { name: 'Go' }))
    fireEvent.submit(screen.getByLabelText('Type the name, A'))
    expect(confirm).not.toHaveBeenCalled()
  })
})
