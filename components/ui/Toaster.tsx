'use client'

import { Toast } from 'radix-ui'
import { useSyncExternalStore } from 'react'
import { ToastCard } from './ToastCard'
import { toastStore, type ToastNotice } from './toastStore'

const none: readonly ToastNotice[] = []

/** Where toasts stand: bottom left, reached by F8. */
export function Toaster() {
  const notices = useSyncExternalStore(toastStore.subscribe, toastStore.read, () => none)
  return (
    <Toast.Provider duration={10_000} label="Notice" swipeDirection="left">
      {notices.map((notice) => (
        <ToastCard key={notice.id} notice={notice} />
      ))}
      <Toast.Viewport
        label="Notices ({hotkey})"
        className="fixed bottom-4 left-4 z-50 plain-list flex flex-col gap-2 max-sm:right-4"
      />
    </Toast.Provider>
  )
}
