import type { ActionResult } from '@/lib/actions/result'
import { stateAfterRefusal, type AutosaveState } from './autosaveState'
import { browserCopy } from './browserCopy'

export interface AutosaveOptions<Values, Data> {
  values: Values
  /** A server action. It must guard against overwriting what someone else saved (kind `stale`). */
  save: (values: Values) => Promise<ActionResult<Data>>
  /** Quiet time after the last key before it saves. */
  delayMs?: number
  /** Keeps unsaved values in this browser under this name, for a page closed while offline. */
  keepAs?: string
  onSaved?: (data: Data) => void
}

const usualDelayMs = 800
const firstRetrySeconds = 5
const longestRetrySeconds = 60

/**
 * Saves values one save at a time: after a quiet time, again and ever more slowly when it failed, and at once when
 * something was typed while a save ran. Lives outside React, so that a save outlasts the page it was typed on.
 */
export function createAutosaver<Values, Data>(
  first: AutosaveOptions<Values, Data>,
  tell: (state: AutosaveState) => void,
) {
  let options = first
  let saved = JSON.stringify(first.values)
  let running = false
  let waitingForChoice = false
  let retrySeconds = firstRetrySeconds
  let timer: ReturnType<typeof setTimeout> | undefined

  const text = () => JSON.stringify(options.values)

  function keepCopy(): boolean {
    return options.keepAs !== undefined && browserCopy.keep(options.keepAs, options.values)
  }

  function later(milliseconds: number): void {
    clearTimeout(timer)
    timer = setTimeout(() => void run(), milliseconds)
  }

  async function run(): Promise<void> {
    clearTimeout(timer)
    const sending = text()
    if (running || waitingForChoice || sending === saved) return
    running = true
    tell({ name: 'saving' })
    const { state, data } = await attempt(options, retrySeconds)
    running = false
    waitingForChoice = state.name === 'stale'
    if (state.name === 'saved') {
      saved = sending
      retrySeconds = firstRetrySeconds
      if (options.keepAs) browserCopy.drop(options.keepAs)
      if (data !== undefined) options.onSaved?.(data)
    }
    if (state.name === 'signed-out') keepCopy()
    if (state.name === 'failed' || state.name === 'offline') {
      keepCopy()
      later(retrySeconds * 1000)
      retrySeconds = Math.min(longestRetrySeconds, retrySeconds * 2)
    } else if (!waitingForChoice && text() !== sending) {
      // Something was typed meanwhile: this save does not cover it.
      later(0)
    }
    tell(state)
  }

  return {
    run,
    /** The newest values and callbacks, without starting anything. */
    keepUp(next: AutosaveOptions<Values, Data>): void {
      options = next
    },
    /** Something was typed: begins the quiet time again. */
    changed(): void {
      if (text() === saved || waitingForChoice) return
      later(options.delayMs ?? usualDelayMs)
    },
    unsaved: (): boolean => text() !== saved,
    /** Keeps what is not saved in this browser; true when it could be kept. For a page about to be closed. */
    keepUnsaved: (): boolean => text() !== saved && keepCopy(),
    /** After a choice between two versions: what counts as saved now. The next change saves on top of it. */
    settle(values: Values): void {
      saved = JSON.stringify(values)
      waitingForChoice = false
      tell({ name: 'idle' })
    },
  }
}

async function attempt<Values, Data>(
  { save, values }: AutosaveOptions<Values, Data>,
  retrySeconds: number,
): Promise<{ state: AutosaveState; data?: Data }> {
  try {
    const result = await save(values)
    if (!result.ok) return { state: stateAfterRefusal(result, retrySeconds) }
    return { state: { name: 'saved', at: new Date() }, data: result.data }
  } catch {
    return { state: navigator.onLine ? { name: 'failed', retrySeconds } : { name: 'offline' } }
  }
}
