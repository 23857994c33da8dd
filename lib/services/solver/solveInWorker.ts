import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { Worker } from 'node:worker_threads'
import type { Answer, Programme, Solve, SolveLimits } from '@/lib/panel/solver/types'

/** Beyond its own limit the solver may need this long to look at its clock; after that it is ended. */
const GRACE_SECONDS = 5
/** A thread with nothing to do is ended after this long: its memory never shrinks. */
const IDLE_SECONDS = 20

const none = (status: 'stopped' | 'failed' | 'unfinished', why: string): Answer => ({
  status,
  values: null,
  why,
})

let last: Promise<unknown> = Promise.resolve()
let idle: { worker: Worker; timer: NodeJS.Timeout } | null = null

/** Solves in a thread, one programme at a time: a solver fills a processor, and pages need the others. */
export const solveInWorker: Solve = (programme, limits) => {
  const answer = last
    .then(() => solveNow(programme, limits))
    .catch((error: Error) => none('failed', `The solver could not be run: ${error.message}`))
  last = answer
  return answer
}

function takeWorker(): Worker {
  if (idle) {
    const { worker, timer } = idle
    clearTimeout(timer)
    worker.removeListener('error', leaveIdle)
    worker.ref()
    idle = null
    return worker
  }
  const file = join(process.cwd(), 'lib', 'services', 'solver', 'highsWorker.mjs')
  // Imported from the tree by a line of its own: a bundler would take the file along without the WebAssembly beside it.
  return new Worker(`import(${JSON.stringify(pathToFileURL(file).href)})`, { eval: true, execArgv: [] })
}

function keepWorker(worker: Worker): void {
  worker.once('error', leaveIdle)
  worker.unref()
  idle = { worker, timer: setTimeout(leaveIdle, IDLE_SECONDS * 1000).unref() }
}

function leaveIdle(): void {
  void idle?.worker.terminate()
  idle = null
}

function solveNow(programme: Programme, { seconds, relativeGap, signal }: SolveLimits): Promise<Answer> {
  if (signal?.aborted) return Promise.resolve(none('stopped', 'The solver was stopped.'))
  return new Promise((resolve) => {
    const worker = takeWorker()
    const end = (answer: Answer, isWell: boolean) => {
      clearTimeout(timer)
      signal?.removeEventListener('abort', stop)
      worker.off('message', answered).off('error', broken).off('exit', gone)
      if (isWell) keepWorker(worker)
      else void worker.terminate()
      resolve(answer)
    }
    const stop = () => end(none('stopped', 'The solver was stopped.'), false)
    const answered = (answer: Answer) => end(answer, true)
    const broken = (error: Error) =>
      end(none('failed', `The solver could not be run: ${error.message}`), false)
    const gone = () => end(none('failed', 'The solver ended without an answer.'), false)
    const timer = setTimeout(
      () => end(none('unfinished', `The solver did not answer in ${Math.round(seconds)} seconds.`), false),
      (seconds + GRACE_SECONDS) * 1000,
    )
    signal?.addEventListener('abort', stop, { once: true })
    worker.on('message', answered).on('error', broken).on('exit', gone)
    worker.postMessage({ programme, seconds, relativeGap })
  })
}
