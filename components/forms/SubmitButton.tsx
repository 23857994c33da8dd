'use client'

import type { ReactNode } from 'react'
import { Button, type ButtonProps } from '@/components/ui/Button'
import { useActionFormState } from './ActionFormContext'

export interface SubmitButtonProps extends Pick<
  ButtonProps,
  'look' | 'size' | 'full' | 'offReason' | 'busyWord'
> {
  children: ReactNode
}

/** Sends the form around it; busy from the press until the answer. */
export function SubmitButton({ children, ...rest }: SubmitButtonProps) {
  const { busy } = useActionFormState()
  return (
    <Button {...rest} type="submit" busy={busy}>
      {children}
    </Button>
  )
}
