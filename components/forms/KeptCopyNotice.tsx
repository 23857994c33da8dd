'use client'

import { useState, useSyncExternalStore } from 'react'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { browserCopy } from './browserCopy'

export interface KeptCopyNoticeProps {
  /** The name given to `useAutosave`. */
  keepAs: string
  /** Puts the kept values into the form; the schema should look at them first. */
  onBringBack: (values: unknown) => void
}

const never = () => () => undefined

/** On opening a page whose last changes were kept in this browser: bring them back, or let them go. */
export function KeptCopyNotice({ keepAs, onBringBack }: KeptCopyNoticeProps) {
  const kept = useSyncExternalStore(
    never,
    () => browserCopy.read(keepAs) !== null,
    () => false,
  )
  const [settled, setSettled] = useState(false)
  const drop = () => {
    browserCopy.drop(keepAs)
    setSettled(true)
  }
  if (!kept || settled) return null
  return (
    <BarNote tone="lamp">
      <p className="m-0">This browser kept changes that were not saved.</p>
      <div className="mt-2 flex items-center gap-4">
        <Button
          look="secondary"
          size="small"
          onClick={() => {
            onBringBack(browserCopy.read(keepAs))
            drop()
          }}
        >
          Bring them back
        </Button>
        <LinkLikeButton onClick={drop}>Let them go</LinkLikeButton>
      </div>
    </BarNote>
  )
}
