'use client'

import { Button } from '@/components/ui/Button'
import type { ActionResult } from '@/lib/actions/result'
import { useDeed } from './useDeed'

export interface TakeBackButtonProps {
  reference: string
  takeBack: (input: { reference: string }) => Promise<ActionResult<unknown>>
}

/** Brings a draft back that was put away, while the call is open. */
export function TakeBackButton({ reference, takeBack }: TakeBackButtonProps) {
  const { busy, run } = useDeed()
  return (
    <Button
      busy={busy}
      busyWord="Taking it back"
      onClick={() => run(() => takeBack({ reference }), 'Draft taken back')}
    >
      Take this draft back
    </Button>
  )
}
