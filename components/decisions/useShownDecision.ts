'use client'

import { useEffect, useState } from 'react'
import { decisionButtonId } from './unopened'

/** Which decision is open, and a way to open one and bring it before its reader, the focus on its number. */
export function useShownDecision() {
  const [open, setOpen] = useState<number | null>(null)
  const [sought, setSought] = useState<{ proposalId: number } | null>(null)
  useEffect(() => {
    const button = sought && document.getElementById(decisionButtonId(sought.proposalId))
    button?.focus({ preventScroll: true })
    button?.scrollIntoView({ block: 'start' })
  }, [sought])
  const show = (proposalId: number) => {
    setOpen(proposalId)
    setSought({ proposalId })
  }
  return { open, setOpen, show }
}
