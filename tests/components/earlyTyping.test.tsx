import { act, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { hydrateRoot, type Root } from 'react-dom/client'
import { renderToString } from 'react-dom/server'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { ActionResult } from '@/lib/actions/result'

// Seen to fail with useTypedEarly's ref left out (the title comes back empty), and with the button never asleep.

const schema = z.object({ title: z.string(), why: z.string(), place: z.string() })
const action = vi.fn<(values: z.input<typeof schema>) => Promise<ActionResult<null>>>()

function Sheet() {
  const form = useActionForm({
    schema,
    action,
    defaultValues: { title: '', why: 'As sent', place: 'As sent' },
  })
  return (
    <ActionForm form={form} label="Sheet">
      <TextField name="title" label="Title" />
      <TextAreaField name="why" label="Why" />
      <TextField name="place" label="Place" />
      <SubmitButton>Save</SubmitButton>
    </ActionForm>
  )
}

let holder: HTMLElement
let root: Root
beforeEach(() => {
  action.mockReset().mockResolvedValue({ ok: true, data: null })
  holder = document.createElement('div')
  document.body.append(holder)
  holder.innerHTML = renderToString(<Sheet />)
})
afterEach(() => {
  act(() => root.unmount())
  holder.remove()
})

const title = () => screen.getByLabelText<HTMLInputElement>('Title')
const why = () => screen.getByLabelText<HTMLTextAreaElement>('Why')
const save = () => screen.getByRole<HTMLButtonElement>('button', { name: 'Save' })

/** What a browser does while the code is still on its way: the keys go into the element and nowhere else. */
function typeEarly(element: HTMLInputElement | HTMLTextAreaElement, text: string) {
  element.value = text
}

async function wake() {
  await act(async () => {
    root = hydrateRoot(holder, <Sheet />)
    await Promise.resolve()
  })
}

describe('a form on a slow line', () => {
  it('cannot be sent by the browser before it is alive, nor put what was typed into the address', async () => {
    expect(save().disabled).toBe(true)
    expect(holder.querySelector('form')?.method).toBe('post')
    await wake()
    expect(save().disabled).toBe(false)
  })

  it('keeps what was typed before it was alive, and sends it', async () => {
    typeEarly(title(), 'Dust in early discs')
    typeEarly(why(), 'Because')
    await wake()
    expect(title().value).toBe('Dust in early discs')
    expect(why().value).toBe('Because')
    await userEvent.click(save())
    await waitFor(() =>
      expect(action).toHaveBeenCalledWith({ title: 'Dust in early discs', why: 'Because', place: 'As sent' }),
    )
  })

  it('keeps what is typed afterwards as ever', async () => {
    typeEarly(title(), 'Dust')
    await wake()
    await userEvent.type(title(), ' lanes')
    await userEvent.click(save())
    await waitFor(() => expect(action).toHaveBeenCalledTimes(1))
    expect(action.mock.calls[0]?.[0].title).toBe('Dust lanes')
  })
})
