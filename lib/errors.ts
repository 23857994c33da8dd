/** Every expected failure: a closed list, each shown in words. Anything else shows a reference number only. */
export type RefusalKind =
  | 'not-signed-in'
  | 'forbidden'
  | 'not-found'
  | 'invalid'
  | 'stale'
  | 'closed'
  | 'too-large'
  | 'wrong-media-type'
  | 'too-many'
  | 'unavailable'
  | 'integrity'

/** Someone else changed the same thing first: both versions, field by field. */
export interface StaleDetails {
  changedBy: string
  changedAt: string
  version: number
  theirs: Record<string, unknown>
}

const mark = Symbol.for('noctuary.refusal')

/**
 * An expected failure. Recognised by a mark, not by its class: the built server may hold this file in several
 * bundles, each with a class of its own, and `instanceof` must be true across them.
 */
export class Refusal extends Error {
  static override [Symbol.hasInstance](value: unknown): value is Refusal {
    return typeof value === 'object' && value !== null && mark in value
  }

  readonly [mark] = true
  override readonly name = 'Refusal'
  readonly kind: RefusalKind
  readonly fieldErrors: Readonly<Record<string, string>>
  readonly stale: StaleDetails | null
  readonly retryAfterSeconds: number | null

  constructor(
    kind: RefusalKind,
    message: string,
    more: {
      fieldErrors?: Record<string, string>
      stale?: StaleDetails
      retryAfterSeconds?: number
      cause?: unknown
    } = {},
  ) {
    super(message, { cause: more.cause })
    this.kind = kind
    this.fieldErrors = more.fieldErrors ?? {}
    this.stale = more.stale ?? null
    this.retryAfterSeconds = more.retryAfterSeconds ?? null
  }
}

/** Makers of refusals, so that the same failure reads the same everywhere. */
export const refuse = {
  notSignedIn: () => new Refusal('not-signed-in', 'Sign in first.'),
  forbidden: (sentence: string) => new Refusal('forbidden', sentence),
  /** Also where existence itself is secret: never says that the thing exists. */
  notFound: (what: string) =>
    new Refusal('not-found', `There is no such ${what}, or it is not yours to see.`),
  invalid: (message: string, fieldErrors: Record<string, string> = {}) =>
    new Refusal('invalid', message, { fieldErrors }),
  field: (field: string, message: string) =>
    new Refusal('invalid', message, { fieldErrors: { [field]: message } }),
  stale: (details: StaleDetails) =>
    new Refusal(
      'stale',
      `${details.changedBy} changed this first. Nothing of yours is lost: compare, and choose.`,
      {
        stale: details,
      },
    ),
  closed: (sentence: string) => new Refusal('closed', sentence),
  tooLarge: (sentence: string) => new Refusal('too-large', sentence),
  mediaType: (sentence: string) => new Refusal('wrong-media-type', sentence),
  tooMany: (retryAfterSeconds: number) =>
    new Refusal('too-many', 'That was tried too often. Wait a little, then try again.', {
      retryAfterSeconds,
    }),
  unavailable: (service: 'database' | 'object store' | 'mail' | 'payment firm', cause?: unknown) =>
    new Refusal(
      'unavailable',
      `The ${service} does not answer at the moment. Nothing is lost; try again in a minute.`,
      {
        retryAfterSeconds: 30,
        cause,
      },
    ),
  integrity: (sentence: string) => new Refusal('integrity', sentence),
}
