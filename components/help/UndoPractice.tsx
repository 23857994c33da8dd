'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'

/** Shows what taking something back looks like, on a harmless row. */
export function UndoPractice() {
  const [there, setThere] = useState(true)
  const putAway = () => {
    setThere(false)
    showToast('Row put away', { undo: () => setThere(true) })
  }
  return (
    <div className="flex flex-wrap items-center gap-4 text-table">
      <span className={there ? undefined : 'text-muted line-through'}>A row to put away</span>
      <Button
        look="secondary"
        size="small"
        onClick={putAway}
        offReason={there ? null : 'put away; take it back within ten seconds, or reload'}
      >
        Put it away
      </Button>
    </div>
  )
}
