import { vi } from 'vitest'

interface Answer {
  status: number
  body?: unknown
}

/** A request that goes as far as the test lets it, in the place of the browser's XMLHttpRequest. */
export class FakeRequest {
  /** All that were made, the newest last. */
  static made: FakeRequest[] = []
  static install() {
    FakeRequest.made = []
    vi.stubGlobal('XMLHttpRequest', FakeRequest)
  }
  static newest(): FakeRequest {
    const request = FakeRequest.made.at(-1)
    if (!request) throw new Error('nothing was sent')
    return request
  }

  readonly upload: { onprogress?: (event: object) => void; onload?: () => void } = {}
  onload?: () => void
  onerror?: () => void
  responseType = ''
  status = 0
  response: unknown = null
  url = ''
  form = new FormData()
  isAborted = false

  constructor() {
    FakeRequest.made.push(this)
  }

  open(_: string, url: string) {
    this.url = url
  }

  send(form: FormData) {
    this.form = form
  }

  abort() {
    this.isAborted = true
  }

  progress(loaded: number, total: number) {
    this.upload.onprogress?.({ loaded, total })
    if (loaded === total) this.upload.onload?.()
  }

  answer({ status, body = null }: Answer) {
    this.status = status
    this.response = body
    this.onload?.()
  }

  fail() {
    this.onerror?.()
  }
}
