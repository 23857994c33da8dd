'use client'

import type { ReactNode } from 'react'
import { Button, type ButtonProps } from '@/components/ui/Button'
import { useAlive } from '@/components/ui/useAlive'
import { useActionFormState } from './ActionFormContext'

export interface SubmitButtonProps extends Pick<
  ButtonProps,
  'look' | 'size' | 'full' | 'offReason' | 'busyWord'
> {
  children: ReactNode
}

/**
 * Sends the form around it; busy from the press until the answer. It sleeps until the page is alive: before that the
 * browser itself would send the form, in its own way and to nobody.
 */
export function SubmitButton({ children, ...rest }: SubmitButtonProps) {
  const { busy } = useActionFormState()
  const alive = useAlive()
  return (
    <Button {...rest} type="submit" busy={busy} asleep={!alive}>
      {children}
    </Button>
  )
}
