import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { describe, expect, it } from 'vitest'
import { ScoreRuler } from '@/components/forms/ScoreRuler'
import { scoreAt, scoreX } from '@/components/forms/scoreRuler'

// Seen to fail with the step set to 1.

function Ruler({ start, off }: { start: number | null; off?: boolean }) {
  const [score, setScore] = useState<number | null>(start)
  return (
    <ScoreRuler
      label="Will this answer it"
      counts="counts 3 of 10"
      value={score}
      onChange={setScore}
      off={off}
    />
  )
}

const ruler = () => screen.getByRole('slider', { name: 'Will this answer it' })
const says = () => ruler().getAttribute('aria-valuetext')

describe('the score ruler', () => {
  it.each([
    ['{ArrowRight}', '8.0'],
    ['{ArrowLeft}', '7.0'],
    ['{ArrowUp}{ArrowUp}', '8.5'],
    ['{PageDown}', '6.5'],
    ['{Home}', '0.0'],
    ['{End}', '10.0'],
    ['{End}{ArrowRight}', '10.0'],
    ['4', '4.0'],
    ['4.', '4.5'],
    ['10', '10.0'],
    ['{Delete}', 'not scored yet'],
  ])('goes from 7.5 by %s to %s', async (keys, words) => {
    const user = userEvent.setup()
    render(<Ruler start={7.5} />)
    ruler().focus()
    await user.keyboard(keys)
    expect(says()).toBe(words)
  })

  it.each([
    ['{ArrowRight}', '0.0'],
    ['{ArrowLeft}', '10.0'],
    ['x', 'not scored yet'],
    ['.', 'not scored yet'],
  ])('not yet scored, %s gives %s', async (keys, words) => {
    const user = userEvent.setup()
    render(<Ruler start={null} />)
    ruler().focus()
    await user.keyboard(keys)
    expect(says()).toBe(words)
  })

  it('has buttons for half a point', async () => {
    const user = userEvent.setup()
    render(<Ruler start={7.5} />)
    await user.click(screen.getByRole('button', { name: 'Will this answer it: half a point more' }))
    expect(says()).toBe('8.0')
    await user.click(screen.getByRole('button', { name: 'Will this answer it: half a point less' }))
    expect(says()).toBe('7.5')
  })

  it('follows the pointer to the nearest half', async () => {
    const user = userEvent.setup()
    render(<Ruler start={null} />)
    ruler().getBoundingClientRect = () => new DOMRect(0, 0, 404, 46)
    await user.pointer({ keys: '[MouseLeft>]', target: ruler(), coords: { clientX: scoreX(6.6) } })
    expect(says()).toBe('6.5')
    await user.pointer({ target: ruler(), coords: { clientX: 1000 } })
    expect(says()).toBe('10.0')
  })

  it('stays as it is once frozen', async () => {
    const user = userEvent.setup()
    render(<Ruler start={7.5} off />)
    ruler().focus()
    await user.keyboard('{Home}')
    expect(says()).toBe('7.5')
    expect(screen.queryByRole('button')).toBeNull()
  })

  it('places every half and finds it again', () => {
    const halves = Array.from({ length: 21 }, (_, index) => index / 2)
    expect(halves.map((half) => scoreAt(scoreX(half) / 404))).toEqual(halves)
  })
})
