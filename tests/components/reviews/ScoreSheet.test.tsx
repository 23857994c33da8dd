import { act, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { ScoreSheet } from '@/components/reviews/ScoreSheet'
import type { SheetActions } from '@/components/reviews/sheetTypes'

const ok = <T,>(data: T) => ({ ok: true as const, data })
const actions = {
  saveScore: vi.fn<SheetActions['saveScore']>(),
  saveText: vi.fn<SheetActions['saveText']>(),
  finish: vi.fn<SheetActions['finish']>(),
  reopen: vi.fn<SheetActions['reopen']>(),
}

beforeEach(() => {
  actions.saveScore.mockReset().mockImplementation(({ halfPoints }) => Promise.resolve(ok({ halfPoints })))
  actions.saveText
    .mockReset()
    .mockImplementation(({ version }) => Promise.resolve(ok({ version: version + 1 })))
  actions.finish.mockReset().mockResolvedValue(ok({ version: 2 }))
})

const sheet = (over: Partial<Parameters<typeof ScoreSheet>[0]> = {}) =>
  render(
    <ScoreSheet
      assignmentId={9}
      version={1}
      isFinished={false}
      criteria={[
        { id: 1, title: 'Worth', prompt: 'Does it matter?', weight: 3, halfPoints: 16 },
        { id: 2, title: 'Method', prompt: 'Will it work?', weight: 1, halfPoints: null },
      ]}
      texts={[
        { audience: 'investigators', body: '', version: 0 },
        { audience: 'panel', body: '', version: 0 },
        { audience: 'private', body: '', version: 0 },
      ]}
      savedAtMs={null}
      shut={null}
      mayReopen={false}
      nextHref={null}
      actions={actions}
      {...over}
    />,
  )

describe('ScoreSheet', () => {
  it('stores a score by itself in half points and keeps the mean in step', async () => {
    sheet()
    expect(screen.getByText('Weighted, of the 3 parts scored')).toBeTruthy()
    act(() => screen.getByRole('slider', { name: 'Method' }).focus())
    await userEvent.keyboard('4')
    expect(within(screen.getByText('Weighted')).getByText('7.0')).toBeTruthy()
    await waitFor(() =>
      expect(actions.saveScore).toHaveBeenCalledWith({ assignmentId: 9, criterionId: 2, halfPoints: 8 }),
    )
  })

  it('stores what is typed before it finishes, with the version it has', async () => {
    sheet()
    await userEvent.type(screen.getByLabelText('To the investigators'), 'Fine')
    await userEvent.click(screen.getByRole('button', { name: 'Finish this review' }))
    await waitFor(() => expect(actions.finish).toHaveBeenCalledWith({ assignmentId: 9, version: 1 }))
    const [saved] = actions.saveText.mock.calls.at(-1) ?? []
    expect(saved).toEqual({ assignmentId: 9, audience: 'investigators', body: 'Fine', version: 0 })
    expect(actions.saveText.mock.invocationCallOrder[0]).toBeLessThan(
      actions.finish.mock.invocationCallOrder[0] ?? 0,
    )
  })

  it('shows each missing thing at its place and goes to the first', async () => {
    actions.finish.mockResolvedValue({
      ok: false,
      kind: 'invalid',
      message: 'The review is not whole yet.',
      fieldErrors: { 'score-2': 'Method is not scored yet.', investigators: 'Write something.' },
    })
    sheet()
    await userEvent.click(screen.getByRole('button', { name: 'Finish this review' }))
    expect(await screen.findByText('Method is not scored yet.')).toBeTruthy()
    expect(document.activeElement).toBe(screen.getByRole('slider', { name: 'Method' }))
    expect(screen.getByLabelText('To the investigators').getAttribute('aria-invalid')).toBe('true')
    await userEvent.keyboard('5')
    expect(screen.queryByText('Method is not scored yet.')).toBeNull()
  })

  it('warns quietly of words that give the reviewer away', async () => {
    sheet()
    await userEvent.type(screen.getByLabelText('To the investigators'), 'See my recent work.')
    expect(screen.getByText('“my recent work” may tell the investigators who you are.')).toBeTruthy()
  })

  it('stands still when it is shut, and says why', async () => {
    sheet({ shut: 'This review is finished. Open it again to change it.', isFinished: true, mayReopen: true })
    act(() => screen.getByRole('slider', { name: 'Method' }).focus())
    await userEvent.keyboard('4')
    expect(screen.getByText(/This review is finished/)).toBeTruthy()
    expect(screen.queryByRole('button', { name: 'Finish this review' })).toBeNull()
    expect(screen.getByRole('button', { name: 'Open it again' })).toBeTruthy()
    expect(actions.saveScore).not.toHaveBeenCalled()
  })

  it('shows both versions when another window was first, and saves the one chosen', async () => {
    actions.saveText.mockResolvedValueOnce({
      ok: false,
      kind: 'stale',
      message: 'Another window was first.',
      fieldErrors: {},
      stale: { changedBy: 'You', changedAt: '2027-05-01T00:00:00Z', version: 4, theirs: { body: 'theirs' } },
    })
    sheet()
    await userEvent.type(screen.getByLabelText('To the panel only'), 'mine')
    await userEvent.click(await screen.findByRole('button', { name: 'Keep mine' }, { timeout: 3000 }))
    await waitFor(() =>
      expect(actions.saveText).toHaveBeenLastCalledWith({
        assignmentId: 9,
        audience: 'panel',
        body: 'mine',
        version: 4,
      }),
    )
  })
})
