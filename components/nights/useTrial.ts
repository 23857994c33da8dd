'use client'

import { parseAsString, useQueryState } from 'nuqs'
import { isTried, trialText, type Trial } from '@/lib/domain/decisions/trialSchema'

export interface TrialState {
  /** As it stands in the address; empty where nothing is tried. */
  text: string
  trial: Trial | undefined
  /** Tries something else; nothing is written. */
  onTry: (trial: Trial | undefined) => void
}

/** What is tried on the page of nights, kept in the address so that a link shows the same. */
export function useTrial(): TrialState {
  const [text, setText] = useQueryState(
    'trial',
    parseAsString.withDefault('').withOptions({ history: 'push', scroll: false }),
  )
  const read = text === '' ? null : trialText.safeParse(text)
  const trial = read?.success && isTried(read.data) ? read.data : undefined
  return {
    text: trial ? text : '',
    trial,
    onTry: (next) => void setText(next && isTried(next) ? JSON.stringify(next) : null),
  }
}
