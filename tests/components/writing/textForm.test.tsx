import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { TextForm, type SaveWriting } from '@/components/writing/TextForm'
import type { Reference } from '@/lib/writing/references'

const ost: Reference = {
  key: 'ost',
  line: 1,
  authors: ['Öst K.'],
  year: '2030',
  title: 'Delays',
  where: 'ApJ, 1',
  doi: '',
}
const saved = { ok: true as const, data: { version: 4, savedAt: '2026-12-01T00:00:00.000Z' } }

function show(save: SaveWriting, kept = { text: '', version: 0 }, wordLimit = 5) {
  render(
    <TextForm
      reference="4F7-K2M"
      part="justification"
      kept={kept}
      wordLimit={wordLimit}
      label="Text"
      help="Markdown."
      references={[ost]}
      figures={[{ label: 'map', caption: 'North *up*.', href: '/f/1', widthPx: 10, heightPx: 10 }]}
      save={save}
    />,
  )
  return screen.getByRole('textbox', { name: 'Text' })
}

const preview = () => within(screen.getByRole('region', { name: 'Text, as it will be read' }))

beforeEach(() => localStorage.clear())

// Seen to fail: with the preview of what was kept instead of what is typed, with the count of letters.
describe('a text and its preview', () => {
  it('shows formulas, citations and figures as they will be read, while they are typed', async () => {
    const field = show(vi.fn<SaveWriting>().mockResolvedValue(saved), undefined, 4)
    await userEvent.click(field)
    await userEvent.paste('# Aim\n\nAt $z = 2$ see [[@ost] and [[@fig:map].'.replaceAll('[[', '['))
    expect(await preview().findByRole('heading', { name: 'Aim' })).toBeDefined()
    expect(preview().getByText(/see \[1\] and Figure/)).toBeDefined()
    expect(preview().getByRole('img', { name: 'Figure 1' })).toBeDefined()
    expect(preview().getByText('Öst K. 2030. Delays. ApJ, 1.')).toBeDefined()
    const math = document.querySelector('math')
    expect(math?.textContent).toContain('z=2')
    expect(document.querySelector('.katex-html, [style*="font"]')).toBeNull()
    expect(screen.getByText('5 of 4 words; one word too many to be sent')).toBeDefined()
  })

  it('says what is wrong with a formula, and sets nothing that could act', async () => {
    const field = show(vi.fn<SaveWriting>().mockResolvedValue(saved))
    await userEvent.click(field)
    await userEvent.paste('$\\nosuch$ <img src=x onerror=alert(1)> [go](javascript:alert(1))')
    expect(await preview().findByText(/Undefined control sequence: \\nosuch/)).toBeDefined()
    // Only the figure that was uploaded.
    expect(
      preview()
        .getAllByRole('img')
        .map((one) => one.getAttribute('src')),
    ).toEqual(['/f/1'])
    expect(preview().queryByRole('link')).toBeNull()
    expect(preview().getByText(/<img src=x/)).toBeDefined()
  })

  it('is saved with the version it was read in, and too many words are saved too', async () => {
    const save = vi.fn<SaveWriting>().mockResolvedValue(saved)
    const field = show(save, { text: 'one', version: 3 }, 2)
    await userEvent.type(field, ' two three')
    await waitFor(
      () =>
        expect(save).toHaveBeenCalledWith({
          reference: '4F7-K2M',
          part: 'justification',
          text: 'one two three',
          version: 3,
        }),
      { timeout: 4000 },
    )
  })

  it('shows both texts when someone else was first, and overwrites none', async () => {
    const stale = {
      changedBy: 'Jo Pellering',
      changedAt: '2026-12-01T02:14:05.000Z',
      version: 9,
      theirs: { text: 'Theirs.' },
    }
    const save = vi
      .fn<SaveWriting>()
      .mockResolvedValueOnce({ ok: false, kind: 'stale', message: '', fieldErrors: {}, stale })
      .mockResolvedValue(saved)
    const field = show(save, { text: 'Mine', version: 3 })
    await userEvent.type(field, '.')
    const both = await screen.findByRole('alert', {}, { timeout: 4000 })
    expect(within(both).getByText('Theirs.')).toBeDefined()
    expect(within(both).getByText('Mine.')).toBeDefined()
    await userEvent.click(within(both).getByRole('button', { name: 'Keep all of mine' }))
    await waitFor(() =>
      expect(save).toHaveBeenLastCalledWith(expect.objectContaining({ text: 'Mine.', version: 9 })),
    )
  })

  it('brings back what this browser kept', async () => {
    localStorage.setItem('noctuary:justification-4F7-K2M', JSON.stringify({ text: 'Typed on a train' }))
    const field = show(vi.fn<SaveWriting>().mockResolvedValue(saved))
    await userEvent.click(await screen.findByRole('button', { name: 'Bring them back' }))
    await waitFor(() => expect((field as HTMLTextAreaElement).value).toBe('Typed on a train'))
  })
})
