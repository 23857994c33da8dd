/**
 * The one place every call to database, object store, mail and payments passes.
 * In production it only calls through; a test may make the n-th step fail.
 */
export type StepName = `db:${string}` | `storage:${string}` | `mail:${string}` | `payments:${string}`

/** What a fault gives back is called once the step is done, and may throw too: work done, its answer lost. */
type Fault = (name: StepName) => (() => void) | undefined

let fault: Fault | null = null

/** Test hook: called before each step; may throw in its place or after it. Pass null to remove it. */
export function onEveryStep(next: Fault | null): void {
  fault = next
}

/** Runs one call to the outside, named for logs and for the failure loop. */
export async function step<T>(name: StepName, call: () => Promise<T>): Promise<T> {
  const after = fault?.(name)
  const answer = await call()
  after?.()
  return answer
}
