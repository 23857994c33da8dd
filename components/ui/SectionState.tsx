import { classNames } from './classNames'

export type SectionStateName = 'done' | 'begun' | 'needs-you' | 'waits'

export interface SectionStateProps {
  state: SectionStateName
  /** For `waits`: what it waits for, lower case, `feasibility`. */
  waitsFor?: string
}

const looks: Record<SectionStateName, string> = {
  done: 'text-ink',
  begun: 'font-semibold text-accent',
  'needs-you': 'font-semibold text-not-feasible',
  waits: 'text-muted',
}

/** How far a section is, in words alone. */
export function SectionState({ state, waitsFor }: SectionStateProps) {
  const words = {
    done: 'done',
    begun: 'begun',
    'needs-you': 'needs you',
    waits: waitsFor ? `waits for ${waitsFor}` : 'waits',
  }[state]
  return <span className={classNames('whitespace-nowrap', looks[state])}>{words}</span>
}
