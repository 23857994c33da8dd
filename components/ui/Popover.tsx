'use client'

import { Popover as Radix } from 'radix-ui'
import type { ReactNode } from 'react'

export interface PopoverProps {
  /** A button; it keeps its own words and look. */
  trigger: ReactNode
  /** Names the floating panel for screen readers. */
  label: string
  initiallyOpen?: boolean
  onOpenChange?: (open: boolean) => void
  children: ReactNode
}

/** A floating panel of 376 px, 10 px under what opened it; Escape closes it and gives the focus back. */
export function Popover({ trigger, label, initiallyOpen, onOpenChange, children }: PopoverProps) {
  return (
    <Radix.Root defaultOpen={initiallyOpen} onOpenChange={onOpenChange}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          aria-label={label}
          sideOffset={2}
          collisionPadding={16}
          className="z-50 w-[376px] max-w-[calc(100vw-32px)] float-in rounded border border-edge bg-surface p-4 text-table shadow-float"
        >
          {children}
          <Radix.Arrow asChild width={18} height={9}>
            <svg viewBox="0 0 18 9" width="18" height="9" aria-hidden="true">
              <path d="M0 -1L9 8L18 -1" fill="var(--surface)" stroke="var(--edge)" />
            </svg>
          </Radix.Arrow>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
