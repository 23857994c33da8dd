import { act, fireEvent, render, screen } from '@testing-library/react'
import { useState } from 'react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { SaveWords } from '@/components/forms/SaveWords'
import { StaleComparison } from '@/components/forms/StaleComparison'
import { useAutosave } from '@/components/forms/useAutosave'
import type { ActionResult } from '@/lib/actions/result'

// Seen to fail with the guard on a running save left out (two saves at once), and with the retry left out.

type Values = { hours: string }
const save = vi.fn<(values: Values) => Promise<ActionResult<null>>>()
const yes: ActionResult<null> = { ok: true, data: null }
const stale = {
  changedBy: 'Tomas Quenhart',
  changedAt: '2027-03-18T02:13:58.000Z',
  version: 4,
  theirs: { hours: '2.6' },
}

function Sheet({ keepAs }: { keepAs?: string }) {
  const [hours, setHours] = useState('3.0')
  const { state, settle } = useAutosave({ values: { hours }, save, delayMs: 500, keepAs })
  return (
    <>
      <input aria-label="Hours" value={hours} onChange={(event) => setHours(event.target.value)} />
      <SaveWords state={state} kept={keepAs !== undefined} />
      {state.name === 'stale' ? (
        <StaleComparison
          changedBy={state.stale.changedBy}
          changedAt={state.stale.changedAt}
          rows={[{ label: 'Hours asked', theirs: '2.6', yours: hours }]}
          onKeepTheirs={() => {
            setHours('2.6')
            settle({ hours: '2.6' })
          }}
          onKeepMine={() => settle({ hours: '2.6' })}
        />
      ) : null}
    </>
  )
}

const type = (value: string) => fireEvent.change(screen.getByLabelText('Hours'), { target: { value } })
const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms))
const says = () => screen.getByRole('status').textContent

beforeEach(() => {
  vi.useFakeTimers({ now: new Date('2027-03-18T02:14:05Z') })
  save.mockReset()
  localStorage.clear()
})
afterEach(() => {
  vi.useRealTimers()
})

describe('saving by itself', () => {
  it('waits until typing stops, saves once, and says when', async () => {
    save.mockResolvedValue(yes)
    render(<Sheet />)
    type('2')
    await pass(400)
    type('2.5')
    await pass(400)
    expect(save).not.toHaveBeenCalled()
    await pass(100)
    expect(save.mock.calls).toEqual([[{ hours: '2.5' }]])
    expect(says()).toBe('Saved 02:14:05 UTC')
    await pass(60_000)
    expect(save).toHaveBeenCalledTimes(1)
  })

  it('sends one save at a time, and what was typed meanwhile right after', async () => {
    let answer: (result: ActionResult<null>) => void = () => undefined
    save.mockImplementationOnce(() => new Promise((resolve) => (answer = resolve))).mockResolvedValue(yes)
    render(<Sheet />)
    type('2.5')
    await pass(500)
    expect(says()).toBe('Saving …')
    type('2.4')
    await pass(5000)
    expect(save).toHaveBeenCalledTimes(1)
    answer(yes)
    await pass(1)
    expect(save.mock.calls[1]).toEqual([{ hours: '2.4' }])
  })

  it('tries again ever more slowly when the server does not take it', async () => {
    save
      .mockResolvedValueOnce({
        ok: false,
        kind: 'unavailable',
        message: 'The database does not answer.',
        fieldErrors: {},
      })
      .mockRejectedValueOnce(new TypeError('fetch failed'))
      .mockResolvedValue(yes)
    render(<Sheet />)
    type('2.5')
    await pass(500)
    expect(says()).toBe('Not saved. Trying again in 5 s')
    await pass(5000)
    expect(says()).toBe('Not saved. Trying again in 10 s')
    await pass(9000)
    expect(save).toHaveBeenCalledTimes(2)
    await pass(1000)
    expect(says()).toMatch(/^Saved/)
  })

  it('keeps values in the browser while offline, and saves when the network is back', async () => {
    const online = vi.spyOn(navigator, 'onLine', 'get').mockReturnValue(false)
    save.mockRejectedValueOnce(new TypeError('fetch failed')).mockResolvedValue(yes)
    render(<Sheet keepAs="question-7" />)
    type('2.5')
    await pass(500)
    expect(says()).toBe('Offline: kept in this browser')
    expect(localStorage.getItem('noctuary:question-7')).toBe('{"hours":"2.5"}')
    online.mockReturnValue(true)
    fireEvent(window, new Event('online'))
    await pass(1)
    expect(says()).toMatch(/^Saved/)
    expect(localStorage.getItem('noctuary:question-7')).toBeNull()
    online.mockRestore()
  })

  it('waits for the next change when a value is not right', async () => {
    save.mockResolvedValueOnce({
      ok: false,
      kind: 'invalid',
      message: 'Give hours.',
      fieldErrors: { hours: 'Give hours.' },
    })
    render(<Sheet />)
    type('x')
    await pass(60_000)
    expect(says()).toBe('Not saved: Give hours.')
    expect(save).toHaveBeenCalledTimes(1)
    save.mockResolvedValue(yes)
    type('2')
    await pass(500)
    expect(says()).toMatch(/^Saved/)
  })

  it('saves at once when the page is left inside the app', async () => {
    save.mockResolvedValue(yes)
    const { unmount } = render(<Sheet />)
    type('2.5')
    unmount()
    await pass(1)
    expect(save.mock.calls).toEqual([[{ hours: '2.5' }]])
  })
})

describe('a session that ended while one typed', () => {
  const signedOut = {
    ok: false as const,
    kind: 'not-signed-in' as const,
    message: 'Sign in first.',
    fieldErrors: {},
  }

  // Seen to fail: with the refusal taken for a value that is not right, which keeps nothing.
  it('keeps what was typed in the browser and offers the way to sign in', async () => {
    save.mockResolvedValue(signedOut)
    render(<Sheet keepAs="question-7" />)
    type('2.5')
    await pass(500)
    expect(says()).toContain('Signed out: kept in this browser.')
    expect(screen.getByRole('link', { name: 'Sign in again' }).getAttribute('href')).toMatch(/^\/sign-in/)
    expect(localStorage.getItem('noctuary:question-7')).toBe('{"hours":"2.5"}')
  })

  it('saves as soon as one comes back, signed in on another page', async () => {
    save.mockResolvedValueOnce(signedOut).mockResolvedValue(yes)
    render(<Sheet keepAs="question-7" />)
    type('2.5')
    await pass(500)
    fireEvent(window, new Event('focus'))
    await pass(1)
    expect(says()).toMatch(/^Saved/)
    expect(localStorage.getItem('noctuary:question-7')).toBeNull()
  })

  it('lets the page be left without a question once what was typed is kept', async () => {
    save.mockResolvedValue(signedOut)
    render(<Sheet keepAs="question-7" />)
    type('2.5')
    await pass(500)
    expect(fireEvent(window, new Event('beforeunload', { cancelable: true }))).toBe(true)
  })
})

// Seen to fail: without the listener of the page being hidden.
describe('a page closed before the quiet time is over', () => {
  it('keeps what was typed, and asks before it goes', () => {
    render(<Sheet keepAs="question-7" />)
    type('2.5')
    fireEvent(window, new Event('pagehide'))
    expect(localStorage.getItem('noctuary:question-7')).toBe('{"hours":"2.5"}')
    expect(fireEvent(window, new Event('beforeunload', { cancelable: true }))).toBe(false)
    expect(save).not.toHaveBeenCalled()
  })

  it('keeps nothing where nothing was typed', () => {
    render(<Sheet keepAs="question-7" />)
    fireEvent(window, new Event('pagehide'))
    expect(localStorage.getItem('noctuary:question-7')).toBeNull()
  })
})

describe('someone else was first', () => {
  it.each([
    ['Keep mine', '2.5', 0],
    ['Keep theirs', '2.6', 0],
  ])('%s leaves %s in the field, and the next change is saved', async (button, left) => {
    save
      .mockResolvedValueOnce({ ok: false, kind: 'stale', message: 'Changed.', fieldErrors: {}, stale })
      .mockResolvedValue(yes)
    render(<Sheet />)
    type('2.5')
    await pass(500)
    expect(screen.getByRole('alert', { name: 'Tomas Quenhart changed this' }).textContent).toContain(
      '02:13:58 UTC',
    )
    type('2.4')
    await pass(60_000)
    expect(save).toHaveBeenCalledTimes(1)
    type('2.5')
    fireEvent.click(screen.getByRole('button', { name: button }))
    expect(screen.queryByRole('alert')).toBeNull()
    expect(screen.getByLabelText<HTMLInputElement>('Hours').value).toBe(left)
    type('1.9')
    await pass(500)
    expect(save.mock.calls[1]).toEqual([{ hours: '1.9' }])
  })
})

describe('values kept in this browser', () => {
  it('are offered, brought back once, and then gone', () => {
    localStorage.setItem('noctuary:question-7', '{"hours":"2.5"}')
    const bringBack = vi.fn()
    render(<KeptCopyNotice keepAs="question-7" onBringBack={bringBack} />)
    fireEvent.click(screen.getByRole('button', { name: 'Bring them back' }))
    expect(bringBack).toHaveBeenCalledWith({ hours: '2.5' })
    expect(screen.queryByRole('button')).toBeNull()
    expect(localStorage.getItem('noctuary:question-7')).toBeNull()
  })
})
