import type { RefusalKind } from '../errors'

/** The one map from refusals to HTTP status. */
export const statusOf: Readonly<Record<RefusalKind, number>> = {
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  invalid: 422,
  stale: 409,
  closed: 403,
  'too-large': 413,
  'wrong-media-type': 415,
  'too-many': 429,
  unavailable: 503,
  integrity: 409,
}
