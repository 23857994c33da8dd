import type { ReactNode } from 'react'
import { classNames } from './classNames'
import { verdictStyles, type MarkedVerdict } from './verdictStyles'

export interface BarNoteProps {
  /** The verdict whose colour the 4 px bar at the left takes, `lamp` for time, `accent` for an answer. */
  tone: MarkedVerdict | 'lamp' | 'accent'
  children: ReactNode
}

/** A note with a 4 px bar at its left: a computed verdict under an assessment, an answer, a thing to settle. */
export function BarNote({ tone, children }: BarNoteProps) {
  const bar = tone === 'lamp' ? 'border-lamp' : tone === 'accent' ? 'border-accent' : verdictStyles[tone].bar
  return <div className={classNames('border-l-4 pl-4 text-table', bar)}>{children}</div>
}
