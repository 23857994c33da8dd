import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { LoggedValue } from '@/components/office/LoggedValue'
import { loggedWords } from '@/components/office/loggedWords'

// Seen to fail with false told as none, and with the long value cut without a way to read on.

describe('loggedWords', () => {
  it.each([
    ['', ''],
    ['{"state":"submitted","isReopened":false}', 'state submitted; isReopened no'],
    ['{"waiverId":7,"note":"","dueAt":null}', 'waiverId 7; note none; dueAt none'],
    [
      '{"target":{"name":"Abell","z":0.18},"ids":[1,2],"none":[]}',
      'target (name Abell; z 0.18); ids 1, 2; none none',
    ],
    ['"a word"', 'a word'],
    ['true', 'yes'],
    ['not JSON', 'not JSON'],
  ])('%s is %s', (json, words) => {
    expect(loggedWords(json)).toBe(words)
  })
})

describe('a value of the logbook', () => {
  it('is a dash where nothing was', () => {
    render(<LoggedValue json="" />)
    expect(screen.getByText('–')).toBeTruthy()
  })

  it('opens where it is long', async () => {
    render(<LoggedValue json={JSON.stringify({ reason: 'x'.repeat(200), fee: 'kept' })} />)
    const whole = screen.getByText(/fee kept$/)
    expect(whole.closest('details')?.open).toBe(false)
    await userEvent.click(screen.getByText(/…$/))
    expect(whole.closest('details')?.open).toBe(true)
  })
})
