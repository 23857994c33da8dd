import { json, type FakeRequest, type FakeResponse } from '../web/httpServer'
import { missing } from './ApiError'
import { faultKinds, type Faults } from './Faults'
import type { Api } from './api'
import { afterwards, finishRefunds } from './afterwards'
import { takePast, type PastPayment } from './past'
import type { PaymentStore } from './store'
import type { Webhooks } from './Webhooks'

interface Wish {
  next?: string
  times?: number
  path?: string
  seconds?: number
  count?: number
  /** Seconds by which a resent event's signature lies in the future (negative: in the past). */
  future?: number
  secret?: string
  /** In which order waiting events go out; as they came unless told. */
  order?: 'reversed' | 'shuffled'
  deed?: string
  amount?: number
  status?: string
  payments?: PastPayment[]
}

/** The switches under /mock, for tests and for trying things by hand. */
export async function controlMock(
  request: FakeRequest,
  api: Api,
  webhooks: Webhooks,
  faults: Faults,
): Promise<FakeResponse> {
  const { store } = api
  const name = `${request.method} ${request.path}`
  if (name === 'GET /mock/health') return json(200, { ok: true, webhooks: webhooks.isOn })
  const wish: Wish = JSON.parse(request.body || '{}')
  if (name === 'POST /mock/faults') return armFault(wish, faults)
  if (name === 'DELETE /mock/faults') {
    faults.clear()
    return { status: 204 }
  }
  if (name === 'POST /mock/webhook-off' || name === 'POST /mock/webhook-on') {
    webhooks.switchTo(request.path.endsWith('-on'))
    if (webhooks.isOn) await webhooks.deliverNow()
    return json(200, { webhooks: webhooks.isOn })
  }
  if (name === 'POST /mock/webhook-flush')
    return json(200, {
      statuses: await webhooks.flush(wish.order ?? null, wish.count ?? 1, wish.future ?? 0),
    })
  if (name === 'POST /mock/past')
    return json(200, { taken: takePast(store, wish.payments ?? [], api.pageBase) })
  if (name === 'POST /mock/refunds') return turnRefunds(wish, api)
  const [, paidId] =
    (request.method === 'POST' && /^\/mock\/sessions\/([^/]+)\/afterwards$/.exec(request.path)) || []
  if (paidId !== undefined) {
    afterwards(api, paidId, wish.deed ?? '', wish.amount)
    return json(200, { done: wish.deed })
  }
  const [, eventId] =
    (request.method === 'POST' && /^\/mock\/events\/([^/]+)\/resend$/.exec(request.path)) || []
  if (eventId !== undefined) return resend(eventId, wish, store, webhooks)
  const [, sessionId] =
    (request.method === 'POST' && /^\/mock\/sessions\/([^/]+)\/run-out$/.exec(request.path)) || []
  if (sessionId !== undefined) return runOut(sessionId, store)
  return json(404, { error: 'There is no such switch.' })
}

function armFault({ next, times, path, seconds }: Wish, faults: Faults): FakeResponse {
  const kind = faultKinds.find((known) => known === next)
  if (!kind) return json(400, { error: `next is one of ${faultKinds.join(', ')}.` })
  faults.arm(kind, times, path, seconds)
  return json(200, { armed: kind, times: times ?? 1 })
}

/** What the next refunds come to, and how those under way end. */
function turnRefunds({ next, status }: Wish, api: Api): FakeResponse {
  const turn = (['succeeded', 'pending', 'failed'] as const).find((known) => known === next)
  if (turn) api.store.state.refundsTurn = turn
  const end = (['succeeded', 'failed'] as const).find((known) => known === status)
  const ended = end ? finishRefunds(api, end) : 0
  api.store.changed()
  return json(200, { next: api.store.state.refundsTurn, ended })
}

/** The same event again, `count` times one after another; tells the status of each. */
async function resend(
  id: string,
  wish: Wish,
  store: PaymentStore,
  webhooks: Webhooks,
): Promise<FakeResponse> {
  const event = store.state.events.find((each) => each.id === id)
  if (!event) throw missing('event', id)
  const statuses: number[] = []
  for (let index = 0; index < (wish.count ?? 1); index += 1) {
    statuses.push(await webhooks.send(event, { shift: wish.future, secret: wish.secret }))
  }
  return json(200, { statuses })
}

/** Moves a session's end into the past; the mock then lets it expire as it would by itself. */
function runOut(id: string, store: PaymentStore): FakeResponse {
  const stored = store.state.sessions[id]
  if (!stored) throw missing('checkout.session', id)
  stored.session.expires_at = 1
  store.changed()
  return json(200, stored.session)
}
