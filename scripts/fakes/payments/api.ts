import { json, type FakeRequest, type FakeResponse } from '../web/httpServer'
import { ApiError, invalid, missing } from './ApiError'
import type { Happening } from './attempts'
import { createSession, findSession } from './checkout'
import { expanded } from './expand'
import { listOf, parseForm, textOf, type FormTree } from './form'
import { listPage, typeFilter } from './lists'
import { createRefund } from './refunds'
import type { PaymentStore } from './store'

export interface Api {
  store: PaymentStore
  pageBase: string
  /** Makes events of what happened and has them delivered. */
  announce: (happenings: readonly Happening[], idempotencyKey: string | null) => void
}

type Endpoint = (api: Api, form: FormTree, id: string, request: FakeRequest) => unknown

const endpoints: readonly [method: string, path: RegExp, endpoint: Endpoint][] = [
  ['POST', /^\/v1\/checkout\/sessions$/, (api, form) => createSession(api.store, form, api.pageBase)],
  ['GET', /^\/v1\/checkout\/sessions$/, listSessions],
  ['GET', /^\/v1\/checkout\/sessions\/([^/]+)$/, (api, _form, id) => findSession(api.store, id).session],
  ['GET', /^\/v1\/checkout\/sessions\/([^/]+)\/line_items$/, listLineItems],
  ['POST', /^\/v1\/checkout\/sessions\/([^/]+)\/expire$/, expireSession],
  [
    'GET',
    /^\/v1\/payment_intents\/([^/]+)$/,
    (api, _f, id) => found(api.store.state.intents[id], 'payment_intent', id),
  ],
  ['GET', /^\/v1\/charges$/, listCharges],
  ['GET', /^\/v1\/disputes$/, listDisputes],
  ['GET', /^\/v1\/charges\/([^/]+)$/, (api, _form, id) => found(api.store.state.charges[id], 'charge', id)],
  ['POST', /^\/v1\/refunds$/, refund],
  ['GET', /^\/v1\/refunds$/, listRefunds],
  ['GET', /^\/v1\/refunds\/([^/]+)$/, (api, _form, id) => found(api.store.state.refunds[id], 'refund', id)],
  ['GET', /^\/v1\/events$/, listEvents],
  [
    'GET',
    /^\/v1\/events\/([^/]+)$/,
    (api, _f, id) =>
      found(
        api.store.state.events.find((e) => e.id === id),
        'event',
        id,
      ),
  ],
]

/** Answers one call of the API; every expected failure is an ApiError. */
export function callApi(api: Api, request: FakeRequest): FakeResponse {
  checkKey(request)
  for (const [method, path, endpoint] of endpoints) {
    const match = path.exec(request.path)
    if (!match || method !== request.method) continue
    const form = parseForm(request.method === 'GET' ? request.query.toString() : request.body)
    const result = endpoint(api, form, match[1] ?? '', request)
    return json(200, expanded(api.store, result, listOf(form, 'expand').map(String)))
  }
  throw new ApiError(
    404,
    'invalid_request_error',
    `Unrecognized request URL (${request.method}: ${request.path}).`,
  )
}

function checkKey(request: FakeRequest): void {
  const [, key = ''] = /^Bearer (.+)$/.exec(request.headers.authorization ?? '') ?? []
  if (!/^(sk|rk)_test_/.test(key)) {
    throw new ApiError(401, 'invalid_request_error', 'Give a test API key: this mock moves no money.')
  }
}

function found<Found>(object: Found | undefined, what: string, id: string): Found {
  if (!object) throw missing(what, id)
  return object
}

function listSessions({ store }: Api, query: FormTree): unknown {
  const intent = textOf(query, 'payment_intent')
  const status = textOf(query, 'status')
  const sessions = Object.values(store.state.sessions)
    .map(({ session }) => session)
    .filter((session) => intent === null || session.payment_intent === intent)
    .filter((session) => status === null || session.status === status)
  return listPage(sessions, query, '/v1/checkout/sessions')
}

function listLineItems({ store }: Api, _query: FormTree, id: string): unknown {
  const data = findSession(store, id).lineItems
  return { object: 'list', data, has_more: false, url: `/v1/checkout/sessions/${id}/line_items` }
}

function expireSession(api: Api, _form: FormTree, id: string, request: FakeRequest): unknown {
  const { session } = findSession(api.store, id)
  if (session.status !== 'open') {
    throw invalid(
      `Only Checkout Sessions with a status in ["open"] can be expired. This one is ${session.status}.`,
    )
  }
  Object.assign(session, { status: 'expired', url: null })
  api.store.changed()
  api.announce([{ type: 'checkout.session.expired', object: session }], keyOf(request))
  return session
}

function refund(api: Api, form: FormTree, _id: string, request: FakeRequest): unknown {
  const { refund: made, happenings } = createRefund(api.store, form)
  api.announce(happenings, keyOf(request))
  return made
}

function listRefunds({ store }: Api, query: FormTree): unknown {
  const intent = textOf(query, 'payment_intent')
  const refunds = Object.values(store.state.refunds).filter(
    (each) => !intent || each.payment_intent === intent,
  )
  return listPage(refunds, query, '/v1/refunds')
}

function listCharges({ store }: Api, query: FormTree): unknown {
  const intent = textOf(query, 'payment_intent')
  const charges = Object.values(store.state.charges)
    .filter((each) => !intent || each.payment_intent === intent)
    .sort((a, b) => a.created - b.created)
  return listPage(charges, query, '/v1/charges')
}

function listDisputes({ store }: Api, query: FormTree): unknown {
  const intent = textOf(query, 'payment_intent')
  const disputes = Object.values(store.state.disputes).filter(
    (each) => !intent || each.payment_intent === intent,
  )
  return listPage(disputes, query, '/v1/disputes')
}

function listEvents({ store }: Api, query: FormTree): unknown {
  const wanted = typeFilter(query)
  return listPage(
    store.state.events.filter((event) => wanted(event.type)),
    query,
    '/v1/events',
  )
}

function keyOf(request: FakeRequest): string | null {
  const key = request.headers['idempotency-key']
  return typeof key === 'string' ? key : null
}
