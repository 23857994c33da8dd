import { fireEvent, render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { FileField } from '@/components/forms/FileField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FileSending } from '@/components/forms/FileRow'

// Seen to fail with the size check of fileProblem left out.

const schema = z.object({ paper: z.custom<File | null>(() => true) })
const onFile = vi.fn<(file: File) => void>()

function Papers({ sending = null }: { sending?: FileSending | null }) {
  const form = useActionForm({
    schema,
    action: async () => ({ ok: true as const, data: null }),
    defaultValues: { paper: null },
  })
  return (
    <ActionForm form={form}>
      <FileField
        name="paper"
        label="Justification"
        endings={['.pdf']}
        maxBytes={1000}
        sending={sending}
        onFile={onFile}
      />
    </ActionForm>
  )
}

const input = () => screen.getByLabelText<HTMLInputElement>('Justification')
const pdf = (name: string, bytes: number) =>
  new File([new Uint8Array(bytes)], name, { type: 'application/pdf' })

describe('a file', () => {
  it.each([
    ['a picture', new File(['x'], 'quads.jpg', { type: 'image/jpeg' }), 'quads.jpg is not a PDF file.'],
    ['an empty one', pdf('quads.pdf', 0), 'quads.pdf is empty.'],
    ['one too large', pdf('quads.pdf', 2000), 'quads.pdf has 2 kB; at most 1 kB can be sent.'],
  ])('is refused before it is sent: %s', async (_, file, sentence) => {
    const user = userEvent.setup({ applyAccept: false })
    onFile.mockClear()
    render(<Papers />)
    await user.upload(input(), file)
    await waitFor(() => expect(document.body.textContent?.replaceAll('\u00a0', ' ')).toContain(sentence))
    expect(input().getAttribute('aria-invalid')).toBe('true')
    expect(onFile).not.toHaveBeenCalled()
  })

  it('is taken, named with its size, and its message goes', async () => {
    const user = userEvent.setup()
    onFile.mockClear()
    render(<Papers />)
    await user.upload(input(), pdf('quads.pdf', 0))
    await screen.findByText('quads.pdf is empty.')
    await user.upload(input(), pdf('quads-v6.pdf', 812))
    expect(await screen.findByText('quads-v6.pdf')).toBeTruthy()
    expect(screen.queryByText('quads.pdf is empty.')).toBeNull()
    expect(onFile).toHaveBeenCalledTimes(1)
    expect(screen.getByRole('button', { name: 'Choose another file' })).toBeTruthy()
  })

  it('can be dropped, and shows how far it has got', async () => {
    render(<Papers sending={{ share: 0.64, words: '64 %, looking for names' }} />)
    fireEvent.drop(screen.getByText('Drop here'), { dataTransfer: { files: [pdf('quads-v6.pdf', 812)] } })
    const bar = await screen.findByRole('progressbar', { name: 'Sending quads-v6.pdf' })
    expect(bar.getAttribute('aria-valuenow')).toBe('64')
    expect(screen.getByText('64 %, looking for names')).toBeTruthy()
  })
})
