import { createHash } from 'node:crypto'
import type { FakeRequest, FakeResponse } from '../web/httpServer'
import { ApiError } from './ApiError'
import type { PaymentStore } from './store'

/** Remembers the first answer for each key, errors of execution included, and replays it. */
export class Idempotency {
  readonly #store: PaymentStore
  readonly #busy = new Set<string>()

  constructor(store: PaymentStore) {
    this.#store = store
  }

  async once(request: FakeRequest, execute: () => Promise<FakeResponse>): Promise<FakeResponse> {
    const key = request.headers['idempotency-key']
    if (request.method !== 'POST' || typeof key !== 'string' || key === '') return execute()
    if (key.length > 255) {
      throw new ApiError(400, 'invalid_request_error', 'Idempotency keys have at most 255 characters.')
    }
    if (this.#busy.has(key)) {
      throw new ApiError(
        409,
        'idempotency_error',
        'There is currently another in-progress request using this idempotency key.',
        'idempotency_key_in_use',
      )
    }
    const fingerprint = createHash('sha256').update(`${request.path}\n${request.body}`).digest('hex')
    const known = this.#store.state.answers[key]
    if (known) return replay(known.fingerprint === fingerprint, known.status, known.body)
    this.#busy.add(key)
    try {
      const response = await execute()
      if (worthKeeping(response)) {
        this.#store.state.answers[key] = { fingerprint, status: response.status, body: String(response.body) }
        this.#store.changed()
      }
      return response
    } finally {
      this.#busy.delete(key)
    }
  }
}

/** Refused parameters and rate limits never began to execute, so the same key may be used again. */
function worthKeeping(response: FakeResponse): boolean {
  return response.status < 400 || response.status >= 500 || response.status === 402
}

function replay(sameParameters: boolean, status: number, body: string): FakeResponse {
  if (!sameParameters) {
    throw new ApiError(
      400,
      'idempotency_error',
      'Keys for idempotent requests can only be used with the same parameters they were first used with.',
    )
  }
  return { status, headers: { 'content-type': 'application/json', 'idempotent-replayed': 'true' }, body }
}
