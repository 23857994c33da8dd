'use client'

import { Toast } from 'radix-ui'
import { useEffect, useState } from 'react'
import { NO_BREAK_SPACE } from '@/lib/format'
import { toastStore, type ToastNotice } from './toastStore'

const seconds = 10

/** One notice, with its way back and the seconds left; both stop while it has pointer or focus. */
export function ToastCard({ notice }: { notice: ToastNotice }) {
  const [left, setLeft] = useState(seconds)
  const [paused, setPaused] = useState(false)

  useEffect(() => {
    if (paused) return
    const timer = setInterval(() => setLeft((value) => Math.max(0, value - 1)), 1000)
    return () => clearInterval(timer)
  }, [paused])

  return (
    <Toast.Root
      duration={seconds * 1000}
      onPause={() => setPaused(true)}
      onResume={() => setPaused(false)}
      onOpenChange={(open) => {
        if (!open) toastStore.remove(notice.id)
      }}
      className="flex float-in items-center gap-5 rounded border border-toast-edge bg-toast-ground px-4 py-3 text-toast-ink shadow-float"
    >
      <Toast.Title>{notice.words}</Toast.Title>
      {notice.undo ? (
        <Toast.Action altText="Undo" asChild>
          <button type="button" onClick={notice.undo} className="font-semibold underline underline-offset-4">
            Undo
          </button>
        </Toast.Action>
      ) : null}
      {notice.undo ? (
        <span className="text-caption" aria-hidden="true">
          {left}
          {NO_BREAK_SPACE}s
        </span>
      ) : (
        <Toast.Close className="text-table underline underline-offset-4">Close</Toast.Close>
      )}
    </Toast.Root>
  )
}
