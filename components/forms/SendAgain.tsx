'use client'

import { Button } from '@/components/ui/Button'
import type { Waiting } from './useFileJourney'

/** The button that stopped it is gone: whoever pressed it goes on from here. */
const takeFocus = (button: HTMLButtonElement | null) => button?.focus()

/** A file that was stopped or lost on its way, kept to be sent again. */
export function SendAgain({ waiting, onSend }: { waiting: Waiting; onSend: () => void }) {
  const { why, words } = waiting
  return (
    <div className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-2 text-table">
      <p
        role={why === 'stopped' ? undefined : 'alert'}
        className={why === 'stopped' ? 'm-0 text-muted' : 'm-0 font-semibold text-not-feasible'}
      >
        {words}
        {why === 'offline' ? ' It goes again by itself once you are connected.' : ''}
      </p>
      <Button ref={why === 'stopped' ? takeFocus : undefined} look="secondary" size="small" onClick={onSend}>
        Send it again
      </Button>
    </div>
  )
}
