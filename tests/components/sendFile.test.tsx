import { act, render, screen, waitFor } from '@testing-library/react'
import type { ReactNode } from 'react'
import userEvent from '@testing-library/user-event'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { PaperUpload } from '@/components/proposals/PaperUpload'
import { Toaster } from '@/components/ui/Toaster'
import { FigureUpload } from '@/components/writing/FigureUpload'
import { FakeRequest } from '../support/fakeRequest'

const refresh = vi.fn<() => void>()
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }))
// jsdom's files cannot be read, and its buffers are none to Node's digest.
vi.mock('@/components/forms/fingerprint', () => ({ fingerprint: async () => 'a'.repeat(64) }))

const said = () => document.body.textContent?.replaceAll('\u00a0', ' ') ?? ''
const bar = () => screen.getByRole('progressbar', { name: 'Sending why.pdf' })

beforeEach(() => {
  FakeRequest.install()
  refresh.mockClear()
})
afterEach(() => {
  vi.unstubAllGlobals()
  vi.restoreAllMocks()
  vi.useRealTimers()
})

async function begin(beside: ReactNode = null) {
  const user = userEvent.setup()
  const { container } = render(
    <>
      <PaperUpload to="/proposals/4F7-K2M/papers/new" kind="justification" label="The file" help="A PDF" />
      {beside}
    </>,
  )
  const input = container.querySelector('input[type="file"]')
  if (!(input instanceof HTMLInputElement)) throw new Error('no input')
  const file = new File([new Uint8Array(4_000_000)], 'why.pdf', { type: 'application/pdf' })
  await user.upload(input, file)
  await waitFor(() => expect(FakeRequest.made).toHaveLength(1))
  return user
}

// Seen to fail: with Stop left when all was sent, and with a sentence for every step.
describe('a file on its way', () => {
  it('says how many bytes have gone, and what is done to it after', async () => {
    await begin(<Toaster />)
    const request = FakeRequest.newest()
    expect(request.url).toBe('/proposals/4F7-K2M/papers/new')
    expect(request.form.get('kind')).toBe('justification')
    expect(request.form.get('again')).toBeNull()
    act(() => request.progress(1_000_250, 4_001_000))
    expect(bar().getAttribute('aria-valuenow')).toBe('25')
    expect(bar().getAttribute('aria-valuetext')?.replaceAll('\u00a0', ' ')).toBe('1.0 MB of 4.0 MB sent')
    act(() => request.progress(4_001_000, 4_001_000))
    expect(bar().getAttribute('aria-valuenow')).toBe('100')
    expect(screen.queryByRole('button', { name: /^Stop/ })).toBeNull()
    act(() => request.answer({ status: 200, body: { fileName: 'why.pdf' } }))
    await waitFor(() => expect(said()).toContain('why.pdf is kept'))
    expect(screen.queryByRole('progressbar')).toBeNull()
    expect(refresh).toHaveBeenCalled()
  })

  it('is heard of three times, whatever the number of steps', async () => {
    await begin()
    const heard = new Set<string>()
    for (let step = 1; step <= 100; step += 1) {
      act(() => FakeRequest.newest().progress(step * 40_000, 4_000_000))
      heard.add(screen.getByRole('status').textContent?.replaceAll('\u00a0', ' ') ?? '')
    }
    expect([...heard]).toEqual([
      'Sending why.pdf, 4.0 MB',
      'Half of why.pdf is sent',
      'All 4.0 MB sent; looking it through',
    ])
  })

  it('can be stopped, and sent again as it was chosen', async () => {
    const user = await begin()
    act(() => FakeRequest.newest().progress(1_000_000, 4_000_000))
    await user.click(screen.getByRole('button', { name: 'Stop sending why.pdf' }))
    expect(FakeRequest.newest().isAborted).toBe(true)
    await waitFor(() => expect(said()).toContain('Stopped after 1.0 MB of 4.0 MB. Nothing was changed.'))
    expect(screen.queryByRole('alert')).toBeNull()
    const again = screen.getByRole('button', { name: 'Send it again' })
    expect(document.activeElement).toBe(again)
    await user.click(again)
    await waitFor(() => expect(FakeRequest.made).toHaveLength(2))
    expect((FakeRequest.newest().form.get('file') as File | null)?.name).toBe('why.pdf')
    expect(said()).not.toContain('Stopped')
  })

  it('is kept when the connection is lost, and says where it was', async () => {
    const user = await begin()
    act(() => FakeRequest.newest().progress(3_000_000, 4_000_000))
    act(() => FakeRequest.newest().fail())
    const alert = await screen.findByRole('alert')
    expect(alert.textContent?.replaceAll('\u00a0', ' ')).toBe(
      'The connection was lost after 3.0 MB of 4.0 MB. Nothing was changed.',
    )
    // A refresh without a connection would load the page anew, and forget the file.
    expect(refresh).not.toHaveBeenCalled()
    await user.click(screen.getByRole('button', { name: 'Send it again' }))
    await waitFor(() => expect(FakeRequest.made).toHaveLength(2))
    expect(FakeRequest.newest().form.get('again')).toBe('yes')
    act(() => FakeRequest.newest().progress(4_000_000, 4_000_000))
    act(() => FakeRequest.newest().fail())
    await waitFor(() =>
      expect(said()).toContain('before the observatory answered. The file may have arrived.'),
    )
  })

  it('goes again by itself once the browser is connected', async () => {
    vi.spyOn(navigator, 'onLine', 'get').mockReturnValue(false)
    await begin()
    act(() => FakeRequest.newest().fail())
    await waitFor(() => expect(said()).toContain('goes again by itself'))
    act(() => void window.dispatchEvent(new Event('online')))
    await waitFor(() => expect(FakeRequest.made).toHaveLength(2))
    act(() => void window.dispatchEvent(new Event('online')))
    expect(FakeRequest.made).toHaveLength(2)
  })

  it('is given up when nothing moves any more', async () => {
    vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'], shouldAdvanceTime: true })
    await begin()
    act(() => FakeRequest.newest().progress(1_000_000, 4_000_000))
    await act(() => vi.advanceTimersByTimeAsync(40_000))
    expect(FakeRequest.newest().isAborted).toBe(false)
    await act(() => vi.advanceTimersByTimeAsync(6_000))
    expect(FakeRequest.newest().isAborted).toBe(true)
    expect((await screen.findByRole('alert')).textContent).toContain('The connection was lost')
  })

  it('is not offered again when the file itself is to blame', async () => {
    await begin()
    const problem = { detail: 'Something.', errors: [{ pointer: '/file', detail: 'Too long.' }] }
    act(() => FakeRequest.newest().answer({ status: 422, body: problem }))
    expect(await screen.findByText('Too long.')).toBeDefined()
    expect(screen.queryByRole('button', { name: 'Send it again' })).toBeNull()
  })

  it('is offered again when the store does not answer', async () => {
    await begin()
    act(() =>
      FakeRequest.newest().answer({ status: 503, body: { detail: 'The object store does not answer.' } }),
    )
    expect(await screen.findByText('The object store does not answer.')).toBeDefined()
    expect(screen.getByRole('button', { name: 'Send it again' })).toBeDefined()
  })
})

describe('a picture', () => {
  it('is not sent when its ending is another', async () => {
    const { container } = render(<FigureUpload reference="4F7-K2M" figureId={null} label="A picture" />)
    const input = container.querySelector('input[type="file"]')
    if (!(input instanceof HTMLInputElement)) return expect.fail('no input')
    await userEvent.upload(input, new File(['abc'], 'map.tiff'), { applyAccept: false })
    expect(await screen.findByText(/is not a PNG, JPG and JPEG file/)).toBeDefined()
    expect(FakeRequest.made).toEqual([])
  })

  it('goes to its place among the figures', async () => {
    const { container } = render(<FigureUpload reference="4F7-K2M" figureId={7} label="A picture" />)
    const input = container.querySelector('input[type="file"]')
    if (!(input instanceof HTMLInputElement)) return expect.fail('no input')
    await userEvent.upload(input, new File(['abc'], 'map.png', { type: 'image/png' }))
    await waitFor(() => expect(FakeRequest.made).toHaveLength(1))
    expect(FakeRequest.newest().url).toBe('/proposals/4F7-K2M/figures')
    expect(FakeRequest.newest().form.get('figureId')).toBe('7')
  })
})
