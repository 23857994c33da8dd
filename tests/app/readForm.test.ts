import { describe, expect, it } from 'vitest'
import { readBody } from '@/lib/http/readBody'
import { readForm } from '@/lib/http/readForm'
import { refused } from '../support/refused'

function posted(): Request {
  const form = new FormData()
  form.set('kind', 'justification')
  form.set('file', new File([new Uint8Array([37, 80, 68, 70, 0, 255])], 'why.pdf'))
  form.append('name', 'a')
  form.append('name', 'b')
  return new Request('http://127.0.0.1/x', { method: 'POST', body: form })
}

// Seen to fail: with the bytes read as text, which loses what is not UTF-8, and with no limit.
describe('a form with a file', () => {
  it('is read whole, byte for byte', async () => {
    const request = posted()
    const form = (await readForm(request, await readBody(request, 10_000))) as Record<string, unknown>
    expect(form['kind']).toBe('justification')
    expect(form['name']).toEqual(['a', 'b'])
    expect([...new Uint8Array(await (form['file'] as File).arrayBuffer())]).toEqual([37, 80, 68, 70, 0, 255])
  })

  it('is refused as soon as it is too large', async () => {
    expect((await refused(readBody(posted(), 100))).kind).toBe('too-large')
  })

  it('is refused when it is none, and when it breaks off', async () => {
    const request = new Request('http://127.0.0.1/x', { method: 'POST', body: 'kind=justification' })
    expect((await refused(readForm(request, await readBody(request, 10_000)))).message).toBe(
      'The form cannot be read.',
    )
    const body = new ReadableStream({ pull: (stream) => stream.error(new Error('aborted')) })
    const broken = new Request('http://127.0.0.1/x', { method: 'POST', body, duplex: 'half' } as RequestInit)
    expect((await refused(readBody(broken, 10_000))).message).toBe('The body broke off.')
  })
})
