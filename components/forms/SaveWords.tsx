'use client'

import { usePathname } from 'next/navigation'
import { formatUtcClock } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { AutosaveState } from './autosaveState'

export interface SaveWordsProps {
  state: AutosaveState
  /** When it was last saved before this page was opened. */
  savedBefore?: Date
  /** True when the browser keeps what is not saved (`keepAs`). */
  kept?: boolean
}

/** What became of the last change, for the right of the request strip. */
export function SaveWords({ state, savedBefore, kept = false }: SaveWordsProps) {
  const here = usePathname()
  return (
    <span role="status" className="text-caption text-muted">
      {words(state, savedBefore, kept)}
      {state.name === 'signed-out' ? (
        <>
          {' '}
          <a href={paths.signIn(here ?? undefined)} className="text-accent underline underline-offset-4">
            Sign in again
          </a>
        </>
      ) : null}
    </span>
  )
}

function words(state: AutosaveState, savedBefore: Date | undefined, kept: boolean) {
  switch (state.name) {
    case 'idle':
      return savedBefore ? `Saved ${formatUtcClock(savedBefore)}` : ''
    case 'saving':
      return 'Saving …'
    case 'saved':
      return `Saved ${formatUtcClock(state.at)}`
    case 'offline':
      return (
        <strong className="text-lamp">
          {kept ? 'Offline: kept in this browser' : 'Offline: not saved yet'}
        </strong>
      )
    case 'signed-out':
      return (
        <strong className="text-lamp">
          {kept ? 'Signed out: kept in this browser.' : 'Signed out: not saved yet.'}
        </strong>
      )
    case 'failed':
      return <strong className="text-not-feasible">Not saved. Trying again in {state.retrySeconds} s</strong>
    case 'refused':
      return <strong className="text-not-feasible">Not saved: {state.message}</strong>
    case 'stale':
      return <strong className="text-lamp">Not saved: {state.stale.changedBy} was first</strong>
  }
}
