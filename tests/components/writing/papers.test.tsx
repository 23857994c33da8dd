import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'
import { Recognisable } from '@/components/proposals/Recognisable'
import { ReferencesForm } from '@/components/writing/ReferencesForm'
import { ReferencesRead } from '@/components/writing/ReferencesRead'
import type { SaveWriting } from '@/components/writing/TextForm'

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
