import { join } from 'node:path'
import { Worker } from 'node:worker_threads'
import type { Answer, Programme, Solve, SolveLimits } from '@/lib/panel/solver/types'

/** Beyond its own limit the solver may need this long to look at its clock; after that it is ended. */
const GRACE_SECONDS = 5

const none = (status: 'stopped' | 'failed' | 'unfinished', why: string): Answer => ({
  status,
  values: null,
  why,
})

let last: Promise<unknown> = Promise.resolve()

/** Solves in a thread, one programme at a time: a solver fills a processor, and pages need the others. */
export const solveInWorker: Solve = (programme, limits) => {
  const answer = last.then(() => solveNow(programme, limits))
  last = answer
  return answer
}

function solveNow(programme: Programme, { seconds, relativeGap, signal }: SolveLimits): Promise<Answer> {
  if (signal?.aborted) return Promise.resolve(none('stopped', 'The solver was stopped.'))
  return new Promise((resolve) => {
    const worker = new Worker(
      // Read from the tree, not from the bundle, which does not carry the WebAssembly beside it.
      /* turbopackIgnore: true */ join(process.cwd(), 'lib', 'services', 'solver', 'highsWorker.mjs'),
      { workerData: { programme, seconds, relativeGap }, execArgv: [], stdout: true, stderr: true },
    )
    const stop = () => end(none('stopped', 'The solver was stopped.'))
    const timer = setTimeout(
      () => end(none('unfinished', `The solver did not answer in ${Math.round(seconds)} seconds.`)),
      (seconds + GRACE_SECONDS) * 1000,
    )
    function end(answer: Answer) {
      clearTimeout(timer)
      signal?.removeEventListener('abort', stop)
      resolve(answer)
      void worker.terminate()
    }
    signal?.addEventListener('abort', stop, { once: true })
    worker.once('message', end)
    worker.once('error', (error: Error) =>
      end(none('failed', `The solver could not be run: ${error.message}`)),
    )
    worker.once('exit', () => end(none('failed', 'The solver ended without an answer.')))
  })
}
