'use client'

import { useEffect, useId, useRef, type ReactNode } from 'react'

export interface DialogProps {
  open: boolean
  onClose: () => void
  title: string
  children: ReactNode
}

/** A question that must be answered first. The browser's own dialog: it holds the focus and Escape closes it. */
export function Dialog({ open, onClose, title, children }: DialogProps) {
  const box = useRef<HTMLDialogElement>(null)
  const id = useId()

  useEffect(() => {
    const dialog = box.current
    if (!dialog) return
    if (open && !dialog.open) dialog.showModal()
    if (!open && dialog.open) dialog.close()
  }, [open])

  return (
    <dialog
      ref={box}
      aria-labelledby={id}
      onClose={onClose}
      className="m-auto w-[32rem] max-w-[calc(100vw-32px)] rounded border border-edge bg-surface p-6 text-ink shadow-float backdrop:bg-ink/40 max-sm:p-4"
    >
      <h2 id={id} className="text-section">
        {title}
      </h2>
      {open ? children : null}
    </dialog>
  )
}
