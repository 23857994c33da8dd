import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'
import { PaperUpload, type PaperUploadProps } from '@/components/proposals/PaperUpload'
import { Recognisable } from '@/components/proposals/Recognisable'
import { FigureUpload } from '@/components/writing/FigureUpload'
import type { FigureActions } from '@/components/writing/figureActions'
import { ReferencesForm } from '@/components/writing/ReferencesForm'
import { ReferencesRead } from '@/components/writing/ReferencesRead'
import type { SaveWriting } from '@/components/writing/TextForm'

// jsdom's files cannot be read, and its buffers are none to Node's digest.
vi.mock('@/components/forms/fingerprint', () => ({ fingerprint: async () => 'a'.repeat(64) }))

const saved = { ok: true as const, data: { version: 1, savedAt: '2026-12-01T00:00:00.000Z' } }

// Seen to fail: with places left out.
describe('by what the team could be recognised', () => {
  it('is listed with its places, and what the file says of itself', () => {
    render(
      <Recognisable
        found={[
          {
            kind: 'name',
            what: 'Ilse Marrowby',
            places: [
              { source: 'text', at: 3 },
              { source: 'text', at: 9 },
            ],
          },
          { kind: 'phrase', what: 'our previous work', places: [{ source: 'abstract', at: 1 }] },
        ]}
        properties={[{ name: 'Author', value: 'ilse' }]}
        isDocumentUnread={false}
      />,
    )
    expect(screen.getByText('Two things to look at')).toBeDefined()
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      'Ilse Marrowby (a name of the team), on lines 3 and 9 of the text',
      '“our previous work” (wording that claims a work as yours), on line 1 of the abstract',
    ])
    expect(screen.getByText('Author')).toBeDefined()
  })

  it('says so when nothing was found, and when the file cannot be looked through', () => {
    render(<Recognisable found={[]} properties={[]} isDocumentUnread />)
    expect(screen.getByText(/^Nothing found/)).toBeDefined()
    expect(screen.getByText(/cannot be looked through/)).toBeDefined()
  })
})

describe('references', () => {
  it('are told by line when wrong, and by number when cited', () => {
    const entry = { line: 1, authors: ['A B.'], year: '2030', title: 'T', where: 'ApJ, 1', doi: '' }
    render(
      <ReferencesRead
        references={[
          { ...entry, key: 'one' },
          { ...entry, key: 'two' },
        ]}
        problems={[{ line: 7, sentence: 'x has no year.' }]}
        citations={{ numbers: new Map([['two', 1]]), unknown: [{ key: 'zz', line: 4 }] }}
      />,
    )
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      'Line 7: x has no year.',
      'Line 4 of the text cites zz, which no entry has.',
      'not citedA B. 2030. T. ApJ, 1. [@one]',
      '[1]A B. 2030. T. ApJ, 1. [@two]',
    ])
  })

  // Seen to fail: with the file put in the place of what stands.
  it('are taken in from a file below what stands', async () => {
    const save = vi.fn<SaveWriting>().mockResolvedValue(saved)
    render(<ReferencesForm reference="4F7-K2M" kept={{ text: '@a{x}', version: 1 }} save={save} />)
    const input = screen.getByLabelText<HTMLInputElement>('Take entries in from a file')
    await userEvent.upload(
      input,
      Object.assign(new File(['@b{y}'], 'more.bib'), { text: async () => '@b{y}' }),
    )
    const field = screen.getByRole<HTMLTextAreaElement>('textbox', { name: 'Entries in BibTeX' })
    await waitFor(() => expect(field.value).toBe('@a{x}\n\n@b{y}'))
  })
})

describe('a picture on its way', () => {
  // Seen to fail: with the picture forgotten once it was lost.
  it('can be sent again when it did not get through', async () => {
    const upload = vi
      .fn<FigureActions['upload']>()
      .mockRejectedValueOnce(new Error('no network'))
      .mockResolvedValue({ ok: true, data: { figureId: 1, label: 'map', fileName: 'map.png' } })
    const { container } = render(
      <FigureUpload reference="4F7-K2M" figureId={null} label="A picture" upload={upload} />,
    )
    const input = container.querySelector('input[type="file"]')
    if (!(input instanceof HTMLInputElement)) return expect.fail('no input')
    await userEvent.upload(input, new File(['abc'], 'map.png', { type: 'image/png' }))
    expect(await screen.findByText(/did not get through/)).toBeDefined()
    await userEvent.click(screen.getByRole('button', { name: 'Send it again' }))
    await waitFor(() => expect(upload).toHaveBeenCalledTimes(2))
    const again = upload.mock.calls[1]?.[0]
    expect(again?.get('reference')).toBe('4F7-K2M')
    expect((again?.get('file') as File | null)?.name).toBe('map.png')
    await waitFor(() => expect(screen.queryByText(/did not get through/)).toBeNull())
  })

  it('is not sent when its ending is another', async () => {
    const upload = vi.fn<FigureActions['upload']>()
    const { container } = render(
      <FigureUpload reference="4F7-K2M" figureId={null} label="A picture" upload={upload} />,
    )
    const input = container.querySelector('input[type="file"]')
    if (!(input instanceof HTMLInputElement)) return expect.fail('no input')
    await userEvent.upload(input, new File(['abc'], 'map.tiff'), { applyAccept: false })
    expect(await screen.findByText(/is not a PNG, JPG and JPEG file/)).toBeDefined()
    expect(upload).not.toHaveBeenCalled()
  })
})

// Seen to fail with the file forgotten once it was lost.
describe('a document', () => {
  it('can be sent again after the network failed', async () => {
    const upload = vi
      .fn<PaperUploadProps['upload']>()
      .mockRejectedValueOnce(new Error('no network'))
      .mockResolvedValue({ ok: false, kind: 'invalid', message: 'No.', fieldErrors: { file: 'Too long.' } })
    const { container } = render(
      <PaperUpload reference="4F7-K2M" kind="justification" label="The file" help="A PDF" upload={upload} />,
    )
    const input = container.querySelector('input[type="file"]')
    if (!(input instanceof HTMLInputElement)) return expect.fail('no input')
    await userEvent.upload(input, new File(['abc'], 'why.pdf', { type: 'application/pdf' }))
    await userEvent.click(await screen.findByRole('button', { name: 'Send it again' }))
    await waitFor(() => expect(upload).toHaveBeenCalledTimes(2))
    expect((upload.mock.calls[1]?.[0].get('file') as File | null)?.name).toBe('why.pdf')
    // What is wrong with the file itself is not mended by sending it again.
    expect(await screen.findByText('Too long.')).toBeDefined()
    expect(screen.queryByRole('button', { name: 'Send it again' })).toBeNull()
  })
})
