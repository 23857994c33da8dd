import { Refusal } from '../errors'
import { asRefusal } from './asRefusal'
import { statusOf } from './statusOf'

const titles: Readonly<Record<number, string>> = {
  400: 'Cannot be read',
  401: 'Not signed in',
  403: 'Not allowed',
  404: 'Not found',
  409: 'Out of step',
  413: 'Too large',
  415: 'Wrong media type',
  422: 'Cannot be computed as given',
  429: 'Too often',
  500: 'Failed on our side',
  503: 'Not available',
}

/** How many values are named one by one: a list of a million wrong ones makes no answer of a million lines. */
const mostNamed = 100

/** A JSON pointer (RFC 6901); what is wrong with the whole body is told at its root. */
const pointer = (field: string) => (field === 'form' || field === '' ? '' : `/${field.split('.').join('/')}`)

/** Problem details (RFC 9457) of a failure; an unexpected one says only its reference number. */
export function problem(error: unknown, requestId: string): Response {
  const refusal = asRefusal(error)
  const status = refusal ? statusOf[refusal.kind] : 500
  const errors = refusal
    ? Object.entries(refusal.fieldErrors)
        .slice(0, mostNamed)
        .map(([field, detail]) => ({ pointer: pointer(field), detail }))
    : []
  const body = {
    type: 'about:blank',
    title: titles[status],
    status,
    detail: refusal ? refusal.message : `Something failed on our side. Reference ${requestId}.`,
    instance: `urn:uuid:${requestId}`,
    ...(errors.length > 0 ? { errors } : {}),
  }
  return new Response(JSON.stringify(body), {
    status,
    headers: {
      'content-type': 'application/problem+json',
      'cache-control': 'no-store',
      ...(refusal instanceof Refusal && refusal.retryAfterSeconds
        ? { 'retry-after': String(refusal.retryAfterSeconds) }
        : {}),
    },
  })
}
