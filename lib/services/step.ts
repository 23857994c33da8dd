/**
 * The one place every call to database, object store, mail and payments passes.
 * In production it only calls through; a test may make the n-th step fail.
 */
export type StepName = `db:${string}` | `storage:${string}` | `mail:${string}` | `payments:${string}`

type Fault = (name: StepName) => Promise<void> | void

let fault: Fault | null = null

/** Test hook: called before each step; may throw in its place. Pass null to remove it. */
export function onEveryStep(next: Fault | null): void {
  fault = next
}

/** Runs one call to the outside, named for logs and for the failure loop. */
export async function step<T>(name: StepName, call: () => Promise<T>): Promise<T> {
  if (fault) await fault(name)
  return call()
}
