'use client'

import { useId, useState, type ReactNode } from 'react'
import { Button, type ButtonProps } from './Button'
import { Dialog } from './Dialog'
import { LinkLikeButton } from './LinkLikeButton'

export interface ConfirmTypedProps {
  /** The words on the button that opens it: `Refund …`. */
  trigger: string
  triggerProps?: Pick<ButtonProps, 'look' | 'size' | 'offReason'>
  title: string
  /** What will happen, and what will not. */
  children: ReactNode
  /** What must be typed, and what it is called: `4F7-K2M`, `the reference`. */
  expected: string
  expectedName: string
  /** The deed, with its amount: `Refund EUR 60.00`. */
  confirm: string
  busyWord: string
  /** Returns null when done, or a sentence that says why not. */
  onConfirm: () => Promise<string | null>
}

const same = (a: string, b: string) => a.trim().toLowerCase() === b.trim().toLowerCase()

/** A deed that cannot be taken back: it is typed by name before its button works. */
export function ConfirmTyped(props: ConfirmTypedProps) {
  const { trigger, triggerProps, title, children, expected, expectedName, confirm, busyWord, onConfirm } =
    props
  const id = useId()
  const [open, setOpen] = useState(false)
  const [typed, setTyped] = useState('')
  const [busy, setBusy] = useState(false)
  const [trouble, setTrouble] = useState<string | null>(null)

  const close = () => {
    setOpen(false)
    setTyped('')
    setTrouble(null)
  }

  const send = async () => {
    setBusy(true)
    const answer = await onConfirm().catch(
      () => 'The observatory did not answer. Nothing was changed; try again.',
    )
    setBusy(false)
    if (answer === null) close()
    else setTrouble(answer)
  }

  return (
    <>
      <Button look="secondary" size="small" {...triggerProps} onClick={() => setOpen(true)}>
        {trigger}
      </Button>
      <Dialog open={open} onClose={close} title={title}>
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault()
            if (same(typed, expected) && !busy) void send()
          }}
        >
          <div className="mt-2 text-table">{children}</div>
          <label htmlFor={id} className="mt-4 block font-semibold">
            Type {expectedName}, {expected}
          </label>
          <input
            id={id}
            value={typed}
            autoComplete="off"
            spellCheck={false}
            onChange={(event) => setTyped(event.target.value)}
            className="mt-1 min-h-10 w-full rounded border border-edge bg-surface px-3 max-sm:min-h-11"
          />
          {trouble ? (
            <p role="alert" className="mt-2 text-table font-semibold text-not-feasible">
              {trouble}
            </p>
          ) : null}
          <div className="mt-5 flex flex-wrap items-center gap-5">
            <Button
              type="submit"
              busy={busy}
              busyWord={busyWord}
              offReason={same(typed, expected) ? null : `works once ${expectedName} is typed`}
            >
              {confirm}
            </Button>
            <LinkLikeButton onClick={close}>Leave it</LinkLikeButton>
          </div>
        </form>
      </Dialog>
    </>
  )
}
