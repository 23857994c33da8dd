import { setTimeout as sleep } from 'node:timers/promises'
import { json, type FakeResponse } from '../web/httpServer'

/**
 * `500`, `503`, `429`: an answer instead of the work. `reset`: the line is cut before the work. `timeout`: no answer
 * and no work. `lost-answer`: the work is done, the line is cut. `slow-answer`: the work is done, the answer comes late.
 */
export const faultKinds = ['500', '503', '429', 'reset', 'timeout', 'lost-answer', 'slow-answer'] as const
export type FaultKind = (typeof faultKinds)[number]

/** The work of one request; given an answer, it takes that in place of doing anything. */
type Work = (instead?: FakeResponse) => Promise<FakeResponse>

interface Armed {
  kind: FaultKind
  left: number
  path: string
  seconds: number
}

/** Faults of the API, armed by tests; each wish counts down the requests it spoils. */
export class Faults {
  #armed: Armed[] = []

  /** `path` narrows to requests whose `METHOD /path` holds that text. */
  arm(kind: FaultKind, times = 1, path = '', seconds = 30): void {
    this.#armed.push({ kind, left: times, path, seconds })
  }

  clear(): void {
    this.#armed = []
  }

  async around(request: string, work: Work): Promise<FakeResponse> {
    const armed = this.#armed.find(({ path }) => request.includes(path))
    if (!armed) return work()
    armed.left -= 1
    if (armed.left <= 0) this.#armed = this.#armed.filter((each) => each !== armed)
    switch (armed.kind) {
      case '500':
      case '503':
        // Part of the execution, so remembered under the idempotency key, unlike what happens to the line.
        return work(
          json(Number(armed.kind), {
            error: { type: 'api_error', message: 'Something went wrong on our end (fault switched on).' },
          }),
        )
      case '429':
        return json(429, {
          error: {
            type: 'invalid_request_error',
            code: 'rate_limit',
            message: 'Too many requests (fault switched on).',
          },
        })
      case 'reset':
        return { status: 0, cut: true }
      case 'timeout':
        await sleep(armed.seconds * 1000, undefined, { ref: false })
        return { status: 0, cut: true }
      case 'lost-answer':
        return { ...(await work()), cut: true }
      case 'slow-answer': {
        const response = await work()
        await sleep(armed.seconds * 1000, undefined, { ref: false })
        return response
      }
    }
  }
}
