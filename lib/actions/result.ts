import type { RefusalKind, StaleDetails } from '../errors.ts'

/** What a server action answers. A failure says what is wrong, where, and keeps what was typed in the form. */
export type ActionResult<T> =
  | { ok: true; data: T }
  | {
      ok: false
      kind: RefusalKind | 'unexpected'
      message: string
      fieldErrors: Record<string, string>
      /** Shown for an unexpected failure, found in the log. */
      reference?: string
      stale?: StaleDetails
    }
