'use client'

import { useEffect, useEffectEvent } from 'react'

const isText = (node: EventTarget | null): node is HTMLInputElement =>
  node instanceof HTMLElement && node.matches('input:not([type=checkbox], [type=radio]), textarea, select')

/** True in a field whose own text an undo would mean: anywhere but in a cell of the table that nothing was typed into. */
function isTyping(node: EventTarget | null): boolean {
  if (!isText(node)) return false
  const { cell, typed, entered } = node.dataset
  return cell === undefined || (typed !== undefined && node.value !== entered)
}

/** The usual keys take the last change back, anywhere on the page but where text is being typed. */
export function useUndoKey(undo: () => void): void {
  const take = useEffectEvent(undo)
  useEffect(() => {
    const entered = ({ target }: FocusEvent) => {
      if (!isText(target)) return
      target.dataset.entered = target.value
      delete target.dataset.typed
    }
    const typed = ({ target }: Event) => {
      if (isText(target)) target.dataset.typed = ''
    }
    const pressed = (event: KeyboardEvent) => {
      const isUndo = (event.ctrlKey || event.metaKey) && !event.shiftKey && event.key.toLowerCase() === 'z'
      if (!isUndo || event.defaultPrevented || isTyping(event.target)) return
      event.preventDefault()
      take()
    }
    document.addEventListener('focusin', entered)
    document.addEventListener('input', typed)
    document.addEventListener('keydown', pressed)
    return () => {
      document.removeEventListener('focusin', entered)
      document.removeEventListener('input', typed)
      document.removeEventListener('keydown', pressed)
    }
  }, [])
}
