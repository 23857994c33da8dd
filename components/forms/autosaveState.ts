import type { RefusedResult } from './actionFormTypes'

export type AutosaveState =
  | { name: 'idle' }
  | { name: 'saving' }
  | { name: 'saved'; at: Date }
  /** No network: tries again when it comes back. */
  | { name: 'offline' }
  /** The session ended: tries again when one comes back to the page, having signed in. */
  | { name: 'signed-out' }
  /** The server did not take it; tries again after so many seconds. */
  | { name: 'failed'; retrySeconds: number }
  /** A value is not right: waits for the next change. */
  | { name: 'refused'; message: string; fieldErrors: Record<string, string> }
  /** Someone else saved first: waits until one version is chosen. */
  | { name: 'stale'; stale: NonNullable<RefusedResult['stale']> }

/** What a refused save means for the saving: try again, wait for a change, or wait for a choice. */
export function stateAfterRefusal(result: RefusedResult, retrySeconds: number): AutosaveState {
  if (result.stale) return { name: 'stale', stale: result.stale }
  if (result.kind === 'not-signed-in') return { name: 'signed-out' }
  const passing = ['unavailable', 'unexpected', 'too-many'].includes(result.kind)
  if (passing) return { name: 'failed', retrySeconds }
  return { name: 'refused', message: result.message, fieldErrors: result.fieldErrors }
}
